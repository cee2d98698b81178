import Link from 'next/link'
import { StageTag } from '@/components/ui/tag'
import { stageCode } from '@/lib/seasons/rules'
import { cropWord, type Crop } from '@/lib/topics/crops'
import type { StageKey } from '@/lib/topics/stage-words'

/** The way in for somebody who knows crop and stage but no farm: what there is, crop by crop. */
export function StagesToFind({ filed }: { filed: { crop: Crop; stages: StageKey[] }[] }) {
  if (filed.length === 0) return null
  return (
    <section aria-labelledby="by-stage">
      <h2 id="by-stage" className="mb-3">
        By growth stage
      </h2>
      <div className="sheet ruled">
        {filed.map(({ crop, stages }) => (
          <div key={crop} className="px-4 py-3.5 md:px-5">
            <h3 className="text-base">
              <Link href={`/search?crop=${crop}`} className="inline-flex min-h-6 items-center text-ink">
                {cropWord(crop)}
              </Link>
            </h3>
            <ul className="mt-1 flex flex-wrap gap-x-2">
              {stages.map((stage) => (
                <li key={stage}>
                  <Link
                    href={`/search?crop=${crop}&stage=${stageCode(crop, stage)}`}
                    className="flex min-h-10 items-center no-underline hover:underline"
                  >
                    <StageTag stage={stage} crop={crop} />
                  </Link>
                </li>
              ))}
            </ul>
          </div>
        ))}
      </div>
    </section>
  )
}
