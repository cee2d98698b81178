import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import type { ChapterDraft } from './chapter-draft'
import { TopicPicker } from './topic-picker'

type ChapterRowProps = {
  draft: ChapterDraft
  number: number
  faults: { start?: string; title?: string; topics?: string }
  current: boolean
  onChange: (part: Partial<ChapterDraft>) => void
  onRemove: () => void
  onWatch: () => void
}

/** One chapter on the bench. The time is typed or taken from the film; nothing needs dragging. */
export function ChapterRow({ draft, number, faults, current, onChange, onRemove, onWatch }: ChapterRowProps) {
  return (
    <li
      aria-label={`Chapter ${number}`}
      aria-current={current ? 'true' : undefined}
      className="grid gap-x-4 gap-y-3 border-b border-rule-2 p-4 last:border-0 aria-[current]:bg-mist md:grid-cols-[7rem_minmax(0,1fr)]"
    >
      <TextField
        label="Starts"
        value={draft.start}
        error={faults.start}
        inputMode="decimal"
        onChange={(event) => onChange({ start: event.target.value })}
      />
      <TextField
        label="Title"
        value={draft.title}
        error={faults.title}
        maxLength={60}
        onChange={(event) => onChange({ title: event.target.value })}
      />
      <div className="md:col-start-2">
        <TopicPicker label="Topics" value={draft.topics} onChange={(topics) => onChange({ topics })} />
        {faults.topics && <p className="mt-1.5 text-sm font-semibold text-fault">{faults.topics}</p>}
      </div>
      <div className="flex flex-wrap gap-2 md:col-start-2">
        <Button variant="quiet" onClick={onWatch}>
          Watch from here
        </Button>
        <Button variant="quiet" onClick={onRemove}>
          Remove<span className="sr-only"> chapter {number}</span>
        </Button>
      </div>
    </li>
  )
}
