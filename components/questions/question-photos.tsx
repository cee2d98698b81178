import Image from 'next/image'
import type { PhotoView } from '@/lib/questions/views'

/** Photos sent with a question; place data was taken out of them before they were kept. */
export function QuestionPhotos({ photos }: { photos: PhotoView[] }) {
  if (photos.length === 0) return null
  return (
    <ul className="flex flex-wrap gap-3">
      {photos.map(({ url, width, height, alt }, index) => (
        <li key={url}>
          <a href={url} className="block border border-rule bg-sheet">
            {/* Kept at the size it is drawn in: no optimiser in between. */}
            <Image
              unoptimized
              src={url}
              width={width}
              height={height}
              alt={alt || `Photo ${index + 1} of ${photos.length} sent with the question`}
              className="h-40 w-auto max-w-full object-contain"
            />
          </a>
        </li>
      ))}
    </ul>
  )
}
