import { fullDay } from '@/lib/dates/rules'
import type { RowCorrection } from './row-rules'

/** A correction stands in the text where the mistake was said: what was said, and what is right. */
export function SpokenCorrection({ correction }: { correction: RowCorrection }) {
  return (
    <p role="note" className="mb-2.5 border-l-[3px] border-ink pl-3 text-sm sm:ml-14">
      <b className="font-semibold">Correction, {fullDay(correction.on.slice(0, 10))}: </b>
      said <del>{correction.said}</del>, right is <ins className="font-semibold no-underline">{correction.right}</ins>
    </p>
  )
}
