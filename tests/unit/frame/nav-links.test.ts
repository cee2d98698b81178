import { describe, expect, it } from 'vitest'
import { shortName } from '@/components/frame/frame-person'
import { channelOf, deskLinks, siteLinks } from '@/components/frame/nav-links'

const labels = (pathname: string) => siteLinks(pathname).map(({ label }) => label)
const current = (pathname: string) => siteLinks(pathname).find((link) => link.current)

describe('the bar', () => {
  it('leads to the farms, the questions and the handbook outside a farm', () => {
    expect(labels('/handbook/terms/crown')).toEqual(['Farms', 'Questions', 'Handbook'])
  })

  it('leads to the parts of a farm inside it, and keeps them at its desk', () => {
    expect(labels('/channels/alder-fork')).toEqual(['Season', 'Episodes', 'Questions', 'Handbook'])
    expect(siteLinks('/desk/alder-fork/questions')[1]?.href).toBe('/channels/alder-fork/episodes')
  })

  it('takes the desk of the handbook for no farm', () => {
    expect(channelOf('/desk/handbook')).toBeNull()
    expect(labels('/desk/handbook')).toEqual(['Farms', 'Questions', 'Handbook'])
  })

  it('marks the page itself, and the part that a deeper page lies in', () => {
    expect(current('/channels/alder-fork/episodes')).toMatchObject({ label: 'Episodes', current: 'page' })
    expect(current('/channels/alder-fork/episodes/wheat-stand')).toMatchObject({ label: 'Episodes', current: 'true' })
    expect(current('/channels/alder-fork')).toMatchObject({ label: 'Season', current: 'page' })
  })

  it('marks one link at most, also on the pages that no link leads to', () => {
    for (const pathname of ['/', '/search', '/channels/a/episodes/b', '/desk/a', '/handbook']) {
      expect(siteLinks(pathname).filter((link) => link.current).length, pathname).toBeLessThanOrEqual(1)
    }
    expect(current('/search')).toBeUndefined()
  })

  it('shows the way to the people only to those who have it', () => {
    expect(deskLinks('/desk/a', 'a', false).map(({ label }) => label)).not.toContain('People')
    expect(deskLinks('/desk/a/people', 'a', true).at(-1)).toMatchObject({ label: 'People', current: 'page' })
  })
})

describe('a name in the bar', () => {
  it('is the first name and one letter, without titles', () => {
    expect(shortName('Nell Okafor-Byrne')).toBe('Nell O.')
    expect(shortName('Dr Imani Castellan')).toBe('Imani C.')
    expect(shortName('June')).toBe('June')
    expect(shortName('Ana María Ñuñez')).toBe('Ana Ñ.')
  })
})
