import type { QueueFigures } from '@/lib/questions/views'
import { urgencyExplained } from '@/lib/questions/urgency-rules'

/** "31 waiting for an answer · 5 new · 3 booked". */
export function queueLead({ open, fresh, booked }: QueueFigures): string {
  if (open === 0) return 'Nothing is waiting for an answer.'
  return [`${open} waiting for an answer`, `${fresh} new`, `${booked} booked`].join(' · ')
}

/** How the order comes about. */
export function QueueOrder() {
  return (
    <details>
      <summary className="inline-flex min-h-11 items-center text-water underline">How the order comes about</summary>
      <p className="max-w-measure text-ink-2">{urgencyExplained}</p>
    </details>
  )
}
