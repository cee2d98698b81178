import { describe, expect, it } from 'vitest'
import { changed, chaptersBody, faultOf, inOrder, startHere } from '@/components/desk/chapter-draft'

const drafts = startHere(startHere([], 0), 30).map((draft, n) => ({
  ...draft,
  title: `Part ${n + 1}`,
  topics: ['soil'],
}))

describe('chapters on the bench', () => {
  it('start at the second that is watched and take over the topics of the stretch they cut', () => {
    const three = startHere(drafts, 12.34)
    expect(three.map(({ start }) => start)).toEqual(['0:00.0', '0:12.3', '0:30.0'])
    expect(three[1]).toMatchObject({ title: '', topics: ['soil'] })
  })

  it('are sent in order of their times, however they stand', () => {
    const moved = changed(drafts, drafts[0]?.key ?? '', { start: '0:45' })
    expect(chaptersBody(moved).chapters.map(({ start }) => start)).toEqual([30, 45])
  })

  it('keep a half-written time as typed, last in the list', () => {
    const half = changed(drafts, drafts[0]?.key ?? '', { start: '0:' })
    expect(inOrder(half).at(-1)?.start).toBe('0:')
    expect(half.map(faultOf)[0]).toHaveProperty('start')
  })
})
