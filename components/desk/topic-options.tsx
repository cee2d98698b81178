import { classNames } from '@/components/ui/class-names'
import { StagePatch } from '@/components/ui/stage-patch'
import type { Topic } from '@/lib/topics/rules'

const heads = [
  ['stage', 'Crop stages'],
  ['job', 'Field jobs'],
  ['subject', 'Subjects'],
] as const

type TopicOptionsProps = {
  id: string
  label: string
  found: Topic[]
  chosen: string[]
  active: string | null
  optionId: (code: string) => string
  onChoose: (code: string) => void
}

/** The list under the field: three groups, the ones already chosen ticked. The field keeps the focus throughout. */
export function TopicOptions({ id, label, found, chosen, active, optionId, onChoose }: TopicOptionsProps) {
  return (
    <div
      id={id}
      role="listbox"
      aria-label={label}
      aria-multiselectable="true"
      // A press must not take the focus from the field.
      onMouseDown={(event) => event.preventDefault()}
      className="absolute inset-x-0 top-full z-30 max-h-80 overflow-y-auto border border-t-0 border-ink bg-sheet"
    >
      {heads.map(([kind, head]) => {
        const topics = found.filter((topic) => topic.kind === kind)
        if (topics.length === 0) return null
        return (
          <div key={kind} role="group" aria-label={head}>
            <p aria-hidden="true" className="border-t border-rule px-3 pt-2 pb-1 text-xs font-semibold text-ink-3">
              {head}
            </p>
            {topics.map(({ code, label: words, bbch, stage }) => (
              <div
                key={code}
                id={optionId(code)}
                role="option"
                aria-selected={chosen.includes(code)}
                onClick={() => onChoose(code)}
                className={classNames(
                  'flex min-h-9 cursor-pointer items-center gap-2 px-3 py-1.5 text-sm leading-tight hover:bg-mist',
                  code === active && 'bg-mist outline-2 -outline-offset-2 outline-act',
                  chosen.includes(code) && 'font-semibold',
                )}
              >
                {stage && <StagePatch stage={stage} />}
                <span className="min-w-0 flex-1">{words}</span>
                {bbch && <span className="font-mono text-xs text-ink-3">BBCH {bbch}</span>}
                {chosen.includes(code) && <span aria-hidden="true">✓</span>}
              </div>
            ))}
          </div>
        )
      })}
    </div>
  )
}
