import { describe, expect, it } from 'vitest'
import {
  nextRemedy,
  patience,
  phaseAfter,
  type FilmEvent,
  type Remedy,
  type Trouble,
} from '@/components/player/film-phase'

const after = (...events: FilmEvent[]) => events.reduce(phaseAfter, 'resting')
const remedies = (trouble: Trouble) => {
  const tried: Remedy[] = []
  while (tried.at(-1) !== 'give-up') tried.push(nextRemedy(tried, trouble))
  return tried
}

describe('where the film stands', () => {
  it('rests until it is begun, whatever the element reports', () => {
    expect(after('can-play', 'ran-dry', 'failed')).toBe('resting')
    expect(after('began')).toBe('loading')
  })

  it('waits when a running film runs dry, and is ready again when it can play', () => {
    expect(after('began', 'can-play', 'ran-dry')).toBe('waiting')
    expect(after('began', 'can-play', 'ran-dry', 'can-play')).toBe('ready')
  })

  it('is still loading, not waiting, before the first picture', () => expect(after('began', 'ran-dry')).toBe('loading'))

  it('mends, and says so until a picture comes', () => {
    expect(after('began', 'can-play', 'failed')).toBe('mending')
    expect(after('began', 'can-play', 'failed', 'can-play')).toBe('ready')
  })

  it('stays broken until it is begun again', () => {
    expect(after('began', 'failed', 'gave-up', 'can-play', 'ran-dry')).toBe('broken')
    expect(after('began', 'failed', 'gave-up', 'began')).toBe('loading')
  })
})

describe('mending', () => {
  it('asks a lost line three times more, then takes the plain file, then says so', () => {
    expect(remedies('network')).toEqual(['reload', 'reload', 'reload', 'plain', 'give-up'])
  })

  it('rebuilds a picture that cannot be read twice, then takes the plain file, then says so', () => {
    expect(remedies('media')).toEqual(['rebuild', 'rebuild', 'plain', 'give-up'])
  })

  it('waits longer each time', () => {
    expect(patience(['reload'])).toBeGreaterThan(patience([]))
    expect(patience(['reload', 'reload'])).toBeGreaterThan(patience(['reload']))
  })
})
