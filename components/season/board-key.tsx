import { StagePatch } from '@/components/ui/stage-patch'
import { stageKeys, stageWord } from '@/lib/topics/stage-words'

/** What the patterns say, in the order of a crop's life. */
export function BoardKey() {
  return (
    <ul
      aria-label="Patterns of the stages"
      className="flex flex-wrap gap-x-4.5 gap-y-2 px-3.5 py-3 text-xs text-ink-2 md:px-4.5"
    >
      {stageKeys.map((stage) => (
        <li key={stage} className="flex items-center gap-1.75">
          <StagePatch stage={stage} className="h-4 w-6" />
          {stageWord(stage)}
        </li>
      ))}
    </ul>
  )
}
