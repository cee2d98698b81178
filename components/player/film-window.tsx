'use client'

import { useState, useSyncExternalStore, type RefObject } from 'react'

type FilmWindowProps = { frame: RefObject<HTMLDivElement | null>; video: RefObject<HTMLVideoElement | null> }
/** Phones of one maker know full screen for a bare video only, under a name of their own. */
type PhoneVideo = HTMLVideoElement & { webkitEnterFullscreen?: () => void }

const word = 'inline-flex min-h-11 items-center hover:underline'

/** Where the picture is shown: in the page, over the whole screen, or in a small window on top. */
export function FilmWindow({ frame, video }: FilmWindowProps) {
  const full = useFullScreen()
  const [failed, setFailed] = useState(false)
  const refused = () => setFailed(true)

  const toggleFull = () => {
    const phone = video.current as PhoneVideo | null
    if (full) document.exitFullscreen().catch(refused)
    else if (document.fullscreenEnabled) frame.current?.requestFullscreen().catch(refused)
    else phone?.webkitEnterFullscreen?.()
  }
  const toggleSmall = () => {
    if (document.pictureInPictureElement) document.exitPictureInPicture().catch(refused)
    else video.current?.requestPictureInPicture().catch(refused)
  }

  return (
    <>
      {document.pictureInPictureEnabled && (
        <button type="button" onClick={toggleSmall} className={word}>
          Small window
        </button>
      )}
      <button type="button" onClick={toggleFull} className={word}>
        {full ? 'Back to the page' : 'Full screen'}
      </button>
      <span role="status">{failed ? 'This browser does not allow it here.' : ''}</span>
    </>
  )
}

function subscribe(listener: () => void) {
  document.addEventListener('fullscreenchange', listener)
  return () => document.removeEventListener('fullscreenchange', listener)
}

const useFullScreen = () =>
  useSyncExternalStore(
    subscribe,
    () => document.fullscreenElement !== null,
    () => false,
  )
