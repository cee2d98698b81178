import { useEffect, useReducer, useState } from 'react'
import type { Units } from '@/lib/auth/actor'
import { ApiProblem } from '@/lib/http/client'
import { useSaveSeason } from '@/lib/seasons/hooks'
import type { SeasonView } from '@/lib/seasons/views'
import { draftAfter, draftOf, findingsOf, inputOf } from './season-draft'

/** Asks before a page with unsaved work is left. */
function useLeaveWarning(unsaved: boolean) {
  useEffect(() => {
    if (!unsaved) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [unsaved])
}

type Saved = { edition: number; input: string }

/** A season in the form: the draft, what keeps it from being saved, and saving it over the edition that was read. */
export function useSeasonForm(channel: string, season: SeasonView, units: Units) {
  const [draft, change] = useReducer(draftAfter, draftOf(season, units))
  const [saved, setSaved] = useState<Saved>({
    edition: season.edition,
    input: JSON.stringify(inputOf(draftOf(season, units))),
  })
  const [tried, setTried] = useState(false)
  const saving = useSaveSeason(channel, season.year)
  const findings = tried ? findingsOf(draft, season.year) : []
  const unsaved = JSON.stringify(inputOf(draft)) !== saved.input
  useLeaveWarning(unsaved)

  /** @returns whether it was sent; not while something is wrong with it */
  const save = (edition: number): boolean => {
    setTried(true)
    if (findingsOf(draft, season.year).length > 0) return false
    const input = inputOf(draft)
    saving.mutate(
      { input, edition },
      { onSuccess: (view) => setSaved({ edition: view.edition, input: JSON.stringify(input) }) },
    )
    return true
  }

  const problem = saving.error instanceof ApiProblem ? saving.error : null
  const theirs = problem?.status === 412 ? (problem.body.current as SeasonView | undefined) : undefined
  const takeTheirs = (view: SeasonView) => {
    change({ move: 'replace', draft: draftOf(view, units) })
    setSaved({ edition: view.edition, input: JSON.stringify(inputOf(draftOf(view, units))) })
    saving.reset()
  }
  return { draft, change, findings, unsaved, edition: saved.edition, save, saving, problem, theirs, takeTheirs }
}
