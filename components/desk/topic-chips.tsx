import { StagePatch } from '@/components/ui/stage-patch'
import { topicByCode } from '@/lib/topics/rules'

type TopicChipsProps = {
  codes: string[]
  label: string
  /** `back` says that the person is deleting backwards, towards the chip before. */
  onRemove: (code: string, back: boolean) => void
  onLeave: () => void
}

/** The topics chosen, each with its way out: Enter, Delete or Backspace removes, the arrows go along. */
export function TopicChips({ codes, label, onRemove, onLeave }: TopicChipsProps) {
  if (codes.length === 0) return null
  return (
    <ul aria-label={`${label}, chosen`} className="mb-2 flex flex-wrap gap-1.5">
      {codes.map((code) => (
        <TopicChip key={code} code={code} onRemove={onRemove} onLeave={onLeave} />
      ))}
    </ul>
  )
}

/** Moves the focus to the neighbouring chip; false at either end. */
function stepChip(button: HTMLButtonElement, direction: 'next' | 'previous'): boolean {
  const item = button.closest('li')
  const sibling = direction === 'next' ? item?.nextElementSibling : item?.previousElementSibling
  const target = sibling?.querySelector('button')
  target?.focus()
  return Boolean(target)
}

function TopicChip({ code, onRemove, onLeave }: Omit<TopicChipsProps, 'codes' | 'label'> & { code: string }) {
  const topic = topicByCode(code)
  const words = topic?.label ?? code
  return (
    <li className="inline-flex max-w-full items-stretch border border-rule bg-sheet text-sm leading-tight">
      {topic?.stage && (
        // An SVG left to its own height would be 150 px tall.
        <span className="relative w-5.5 shrink-0">
          <StagePatch stage={topic.stage} className="absolute inset-0 size-full" />
        </span>
      )}
      <span className="min-w-0 px-2 py-1.5">{words}</span>
      <button
        type="button"
        data-code={code}
        aria-label={`Remove ${words}`}
        className="min-w-8 border-l border-rule px-1.5 hover:bg-mist"
        onClick={() => onRemove(code, false)}
        onKeyDown={(event) => {
          if (event.key === 'Delete' || event.key === 'Backspace') {
            event.preventDefault()
            onRemove(code, event.key === 'Backspace')
          } else if (event.key === 'ArrowLeft') stepChip(event.currentTarget, 'previous')
          else if (event.key === 'ArrowRight' && !stepChip(event.currentTarget, 'next')) onLeave()
        }}
      >
        <svg aria-hidden="true" viewBox="0 0 12 12" className="size-3" stroke="currentColor" strokeWidth="1.6">
          <path d="M2 2l8 8M10 2l-8 8" />
        </svg>
      </button>
    </li>
  )
}
