/**
 * Where the film stands, apart from playing or paused: `resting` nothing is fetched yet, `loading` until the first
 * picture, `waiting` the line is slower than the film, `mending` after a failure that is being repaired, `broken` when
 * every way was tried.
 */
export type FilmPhase = 'resting' | 'loading' | 'ready' | 'waiting' | 'mending' | 'broken'

export type FilmEvent = 'began' | 'can-play' | 'ran-dry' | 'failed' | 'gave-up'

/** A late event of a source that was given up must not hide that it was: only beginning again leaves `broken`. */
export function phaseAfter(phase: FilmPhase, event: FilmEvent): FilmPhase {
  if (event === 'began') return 'loading'
  if (phase === 'broken' || phase === 'resting') return phase
  if (event === 'can-play') return 'ready'
  if (event === 'failed') return 'mending'
  if (event === 'gave-up') return 'broken'
  return phase === 'ready' ? 'waiting' : phase
}

/** What failed: the line, or the picture's own data. */
export type Trouble = 'network' | 'media'
export type Remedy = 'reload' | 'rebuild' | 'plain' | 'give-up'

const repeats: Record<Trouble, { remedy: Remedy; times: number }> = {
  network: { remedy: 'reload', times: 3 },
  media: { remedy: 'rebuild', times: 2 },
}

/** What to try next, mildest first; the single plain file is the last way before giving up. */
export function nextRemedy(tried: readonly Remedy[], trouble: Trouble): Remedy {
  if (tried.includes('plain')) return 'give-up'
  const { remedy, times } = repeats[trouble]
  return tried.filter((one) => one === remedy).length < times ? remedy : 'plain'
}

/** Milliseconds to wait before the next try, longer each time. */
export const patience = (tried: readonly Remedy[]) => 1000 * 2 ** Math.min(tried.length, 4)
