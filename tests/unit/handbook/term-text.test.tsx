// @vitest-environment jsdom
import { act } from 'react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { TermText } from '@/components/handbook/term-text'
import type { TermNote } from '@/lib/handbook/views'
import { click, press, render } from '../../support/render'

const crown: TermNote = {
  slug: 'crown',
  label: 'crown',
  definition: 'The short stem at the soil surface.',
  explainer: { slug: 'counting-a-stand', title: 'Counting a stand', state: 'checked', sources: 2 },
}
const text = 'Past the headland, a plant is one crown.'
const terms = [
  { from: 9, to: 17, slug: 'headland' },
  { from: 34, to: 39, slug: 'crown' },
]

let unmount = () => {}
afterEach(() => unmount())

function show(onSentence = () => {}) {
  const shown = render(
    <p onClick={onSentence}>
      <TermText text={text} terms={terms} notes={{ crown }} />
    </p>,
  )
  unmount = shown.unmount
  const links = [...shown.page.querySelectorAll('a')]
  return { ...shown, plain: links[0], term: links[1] }
}

const sheet = () => document.querySelector('[role=dialog]')

describe('a term in running text', () => {
  it('leaves the text as it is and is a link to its page for whoever has no script', () => {
    const { page, plain, term } = show()
    expect(page.textContent).toBe(text)
    expect(plain?.getAttribute('href')).toBe('/handbook/terms/headland')
    expect(term?.getAttribute('href')).toBe('/handbook/terms/crown')
    expect(sheet()).toBeNull()
  })

  it('opens its sheet on a tap, with the definition, how it was checked and where to read on', () => {
    const { term } = show()
    expect(click(term)).toBe(false)
    expect(term?.getAttribute('aria-expanded')).toBe('true')
    expect(sheet()?.textContent).toContain('The short stem at the soil surface.')
    expect(sheet()?.textContent).toContain('Checked against 2 publications')
    const heading = document.getElementById(sheet()?.getAttribute('aria-labelledby') ?? '')
    expect(heading?.textContent).toBe('crown')
    const addresses = [...(sheet()?.querySelectorAll('a') ?? [])].map((link) => link.getAttribute('href'))
    expect(addresses).toEqual(['/handbook/explainers/counting-a-stand', '/handbook/terms/crown'])
  })

  it('closes with Esc and gives the focus back to the term', async () => {
    const { term } = show()
    term?.focus()
    click(term)
    press('Escape', sheet())
    expect(sheet()).toBeNull()
    // The focus moves after the sheet is gone, in a task of its own.
    await act(() => new Promise<void>((done) => setTimeout(done, 0)))
    expect(document.activeElement).toBe(term)
  })

  it('closes when the term is tapped again', () => {
    const { term } = show()
    click(term)
    click(term)
    expect(sheet()).toBeNull()
  })

  it('leaves a click with a key held, for a new tab, to the browser', () => {
    const { term } = show()
    expect(click(term, { ctrlKey: true })).toBe(true)
    expect(sheet()).toBeNull()
  })

  it('keeps its tap, and taps in its sheet, from the sentence around it', () => {
    const sentence = vi.fn()
    const { term, page } = show(sentence)
    click(term)
    click(sheet())
    expect(sentence).not.toHaveBeenCalled()
    click(page.querySelector('p'))
    expect(sentence).toHaveBeenCalledOnce()
  })
})
