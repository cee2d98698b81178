'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { ApiProblem } from '@/lib/http/client'
import { useCreateSeason } from '@/lib/seasons/hooks'
import { newSeasonInput } from '@/lib/seasons/schema'

type BeginSeasonProps = { channel: string; /** The year offered. */ year: number; main: boolean }

/** Begins a crop year and opens it. */
export function BeginSeason({ channel, year, main }: BeginSeasonProps) {
  const router = useRouter()
  const [text, setText] = useState(String(year))
  const [wrong, setWrong] = useState<string>()
  const begin = useCreateSeason(channel)

  const submit = () => {
    const read = newSeasonInput.safeParse({ year: text })
    if (!read.success) return setWrong('Give the year in four figures')
    begin.mutate(read.data.year, {
      onSuccess: (season) => {
        router.push(`/desk/${channel}/season?season=${season.year}`)
        router.refresh()
      },
      onError: (failure) =>
        setWrong(failure instanceof ApiProblem ? failure.detail : 'It did not come through. Try again.'),
    })
  }

  return (
    <form
      noValidate
      className="flex flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault()
        setWrong(undefined)
        submit()
      }}
    >
      <TextField
        label="Crop year"
        inputMode="numeric"
        className="w-40"
        value={text}
        error={wrong}
        onChange={({ target }) => setText(target.value)}
      />
      <Button type="submit" variant={main ? 'primary' : 'line'} busy={begin.isPending && 'Beginning'}>
        Begin this season
      </Button>
    </form>
  )
}
