import Link from 'next/link'
import type { WalkRoundLine } from '@/lib/episodes/rules'

const places: Record<string, { title: string; step: string }> = {
  footage: { title: 'The film', step: 'footage' },
  chapters: { title: 'Chapters', step: 'chapters' },
  topics: { title: 'Filed under a topic', step: 'chapters' },
  captions: { title: 'Captions', step: 'captions' },
  cautions: { title: 'Cautions', step: 'walk-round' },
  questions: { title: 'Questions', step: 'answers' },
}

/** What is looked over before an episode goes out, each line with the way to where it is put right. */
export function WalkRoundList({ base, lines }: { base: string; lines: WalkRoundLine[] }) {
  return (
    <ul className="sheet ruled">
      {lines.map(({ rule, ok, detail }) => {
        const place = places[rule]
        return (
          <li key={rule} className="grid grid-cols-[2rem_minmax(0,1fr)] gap-x-3 px-5 py-4">
            <span aria-hidden="true" className={ok ? 'text-xl text-act' : 'mt-1 size-5 border-2 border-ink'}>
              {ok && '✓'}
            </span>
            <div>
              <h3 className="text-base">
                {place?.title ?? rule}
                <span className="sr-only">{ok ? ': in order' : ': to do'}</span>
              </h3>
              <p className="text-ink-2">
                {detail}{' '}
                {place && place.step !== 'walk-round' && (!ok || rule === 'questions') && (
                  <Link href={`${base}/${place.step}`}>{ok ? 'Questions and answers' : 'See to it'}</Link>
                )}
              </p>
            </div>
          </li>
        )
      })}
    </ul>
  )
}
