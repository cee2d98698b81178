'use client'

import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Select } from '@/components/ui/select'
import { useHydrated } from '@/components/ui/use-hydrated'
import { usePeopleChange } from '@/lib/people/hooks'

const units = [
  { value: 'us', label: 'US: inches, pounds, acres, °F' },
  { value: 'metric', label: 'Metric: millimetres, kilograms, hectares, °C' },
]

/** How a person is called here, and the units they read. */
export function SelfForm({ name, units: chosen }: { name: string; units: string }) {
  const change = usePeopleChange()
  const hydrated = useHydrated()
  return (
    <form
      className="sheet grid gap-5 p-5 md:grid-cols-2"
      onSubmit={(event) => {
        event.preventDefault()
        const form = new FormData(event.currentTarget)
        const body = { name: form.get('name'), units: form.get('units') }
        change.mutate({ path: '/api/me', method: 'PATCH', body })
      }}
    >
      <TextField
        label="Name"
        hint="Shown beside what you ask."
        name="name"
        autoComplete="name"
        required
        maxLength={80}
        defaultValue={name}
      />
      <Select label="Units" hint="Figures are shown in these." name="units" options={units} defaultValue={chosen} />
      <div className="grid gap-3 md:col-span-2">
        {change.error && <Notice tone="failed" title={change.error.detail} />}
        {change.isSuccess && <Notice tone="done" title="Saved." />}
        <Button type="submit" className="justify-self-start" disabled={!hydrated} busy={change.isPending && 'Saving'}>
          Save
        </Button>
      </div>
    </form>
  )
}
