/** How long texts may be, and how many photos are taken with one question and how large as they come from the camera. */
export const TITLE_MOST = 160
export const BODY_MOST = 4000
export const ANSWER_MOST = 2000
export const PHOTOS_MOST = 4
export const PHOTO_BYTES_MOST = 15 * 1024 * 1024
