import { classNames } from '@/components/ui/class-names'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import { StagePatch } from '@/components/ui/stage-patch'
import { stagesOf } from '@/lib/seasons/rules'
import type { Crop } from '@/lib/topics/crops'
import { stageKeys, stageWord, type StageKey } from '@/lib/topics/stage-words'
import type { WindowDraft } from './season-draft'

type WindowRowProps = {
  /** The first row shows the labels; on a wide screen they head the columns of the others too. */
  first: boolean

  window: WindowDraft
  crop: Crop
  errorAt: (field: string) => string | undefined
  onChange: (to: Partial<Omit<WindowDraft, 'key'>>) => void
  onRemove: () => void
}

/** The stages of the crop's key, and the one that stands there although the key has it not, so that it can be seen. */
function options(crop: Crop, current: StageKey) {
  const stages = stagesOf(crop)
  const shown = stageKeys.filter((stage) => stages.includes(stage) || stage === current)
  return shown.map((stage) => ({ value: stage, label: stageWord(stage, crop) }))
}

/** One stage of a lane: which, from which day, to which day. */
export function WindowRow({ first, window, crop, errorAt, onChange, onRemove }: WindowRowProps) {
  const word = stageWord(window.stage, crop)
  return (
    <li
      className={classNames(
        'grid items-start gap-x-4 gap-y-3 py-4 sm:grid-cols-2 lg:grid-cols-[1.5rem_minmax(0,1.4fr)_minmax(0,1fr)_minmax(0,1fr)_auto]',
        !first && 'lg:py-2 lg:[&_label]:sr-only',
      )}
    >
      <StagePatch stage={window.stage} className={classNames('hidden h-11 w-6 lg:block', first && 'lg:mt-7.5')} />
      <Select
        label="Stage"
        className="sm:col-span-2 lg:col-span-1"
        options={options(crop, window.stage)}
        value={window.stage}
        error={errorAt('stage')}
        onChange={({ target }) => onChange({ stage: stageKeys.find((stage) => stage === target.value) ?? '0' })}
      />
      <TextField
        type="date"
        label="From"
        value={window.startsOn}
        error={errorAt('startsOn')}
        onChange={({ target }) => onChange({ startsOn: target.value })}
      />
      <TextField
        type="date"
        label="To, that day included"
        value={window.endsOn}
        error={errorAt('endsOn')}
        onChange={({ target }) => onChange({ endsOn: target.value })}
      />
      <Button variant="quiet" className={classNames('justify-self-start', first && 'lg:mt-7.5')} onClick={onRemove}>
        Remove <span className="sr-only">{word}</span>
      </Button>
    </li>
  )
}
