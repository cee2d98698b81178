import { Notice } from '@/components/ui/notice'
import { Progress } from '@/components/ui/progress'
import { timeCode } from '@/lib/times/rules'
import type { FootageStatus } from '@/lib/footage/views'
import { isUnderWay, sizeWords, stepWords } from '@/lib/footage/rules'
import { FootageSizes } from './footage-sizes'

/** What was found in the film, in the owner's words. */
function Found({ footage }: { footage: FootageStatus }) {
  const length = footage.duration === null ? '' : `, ${timeCode(footage.duration)} long`
  return (
    <div>
      <p>
        <span className="font-semibold break-all">{footage.filename}</span>, {sizeWords(footage.bytes)}
        {length}
      </p>
      {footage.notes.length > 0 && (
        <ul className="mt-2 grid list-disc gap-1 pl-5 text-ink-2">
          {footage.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
      )}
    </div>
  )
}

/** A film that has arrived: what is being done with it or was done, its sizes, and the picture as soon as there is one. */
export function FootageFilm({ footage }: { footage: FootageStatus }) {
  return (
    <div className="grid gap-5 lg:grid-cols-2">
      <div className="sheet grid content-start gap-5 p-5">
        <Found footage={footage} />
        {isUnderWay(footage.state) && (
          <Progress
            value={footage.progress}
            label={stepWords(footage.step)}
            detail="You can leave this page; it goes on without you."
          />
        )}
        {footage.state === 'ready' && (
          <Notice
            tone="done"
            title={footage.isShown ? 'The film is ready.' : 'The film is ready, but a later one is shown.'}
          >
            As filmed, it stays private. What viewers get carries no place and no device.
          </Notice>
        )}
        <FootageSizes renditions={footage.renditions} />
      </div>
      <div className="sheet grid place-items-center bg-loam">
        {footage.preview ? (
          // Captions come in their own step; here the picture is checked.
          <video
            key={footage.preview}
            src={footage.preview}
            controls
            preload="metadata"
            playsInline
            className="max-h-[32rem] w-full"
            aria-label="The film in its smallest size"
          />
        ) : (
          <p className="on-dark p-8 text-on-loam-2">The picture shows here as soon as its smallest size is made.</p>
        )}
      </div>
    </div>
  )
}
