import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Select } from '@/components/ui/select'
import type { Units } from '@/lib/auth/actor'
import { crops, cropWord } from '@/lib/topics/crops'
import { areaRead, type DraftChange, type PlantingDraft } from './season-draft'
import { WindowRow } from './window-row'

type LaneEditorProps = {
  lane: PlantingDraft
  year: number
  units: Units
  errorAt: (field: string) => string | undefined
  change: (change: DraftChange) => void
}

const cropOptions = crops.map((crop) => ({ value: crop, label: cropWord(crop) }))

/** One crop on one field, with its stages. */
export function LaneEditor({ lane, year, units, errorAt, change }: LaneEditorProps) {
  const { key, crop, field, windows } = lane
  const name = `${cropWord(crop)}${field ? `, ${field}` : ''}`
  const to = (patch: Extract<DraftChange, { move: 'change' }>['to']) => change({ move: 'change', key, to: patch })
  return (
    <fieldset className="sheet min-w-0 px-4 pt-4 pb-5 md:px-5.5">
      <legend className="sr-only">{name}</legend>
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 aria-hidden="true">{name}</h2>
        <Button variant="quiet" onClick={() => change({ move: 'remove', key })}>
          Remove this lane <span className="sr-only">({name})</span>
        </Button>
      </div>
      <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-4">
        <Select
          label="Crop"
          options={cropOptions}
          value={crop}
          error={errorAt('crop')}
          onChange={({ target }) => to({ crop: crops.find((one) => one === target.value) ?? crop })}
        />
        <TextField
          label="Field"
          value={field}
          error={errorAt('field')}
          onChange={({ target }) => to({ field: target.value })}
        />
        <TextField
          label={units === 'us' ? 'Area, acres' : 'Area, hectares'}
          inputMode="decimal"
          value={lane.area}
          error={errorAt('areaAcres')}
          onChange={({ target }) => to({ area: target.value, areaAcres: areaRead(target.value, units) })}
        />
        <TextField
          type="date"
          label="Planted on"
          value={lane.plantedOn}
          error={errorAt('plantedOn')}
          onChange={({ target }) => to({ plantedOn: target.value })}
        />
      </div>
      <ol aria-label={`Stages of ${name}`} className="ruled mt-3">
        {windows.map((window, index) => (
          <WindowRow
            key={window.key}
            first={index === 0}
            window={window}
            crop={crop}
            errorAt={(part) => errorAt(`windows.${index}.${part}`)}
            onChange={(patch) => change({ move: 'change-stage', key, stageKey: window.key, to: patch })}
            onRemove={() => change({ move: 'remove-stage', key, stageKey: window.key })}
          />
        ))}
      </ol>
      <Button
        variant="line"
        className="mt-2"
        onClick={() => change({ move: 'add-stage', key, stageKey: crypto.randomUUID(), year })}
      >
        Add a stage <span className="sr-only">to {name}</span>
      </Button>
    </fieldset>
  )
}
