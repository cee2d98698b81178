// @vitest-environment jsdom
import { useState } from 'react'
import { afterEach, describe, expect, it } from 'vitest'
import { TopicPicker } from '@/components/desk/topic-picker'
import { click, press, render, typeInto } from '../../support/render'

let unmount = () => {}
let chosen: string[] = []

function Kept({ first, onChosen }: { first: string[]; onChosen: (codes: string[]) => void }) {
  const [value, setValue] = useState(first)
  const keep = (codes: string[]) => {
    setValue(codes)
    onChosen(codes)
  }
  return <TopicPicker label="Topics" value={value} onChange={keep} />
}

function show(first: string[] = []) {
  chosen = first
  const shown = render(<Kept first={first} onChosen={(codes) => (chosen = codes)} />)
  unmount = shown.unmount
  const field = shown.page.querySelector<HTMLInputElement>('[role=combobox]')
  if (!field) throw new Error('no combobox')
  return { ...shown, field }
}

const options = () => [...document.querySelectorAll('[role=option]')]
const active = (field: Element) => document.getElementById(field.getAttribute('aria-activedescendant') ?? '')
const removal = (code: string) => document.querySelector(`[data-code="${code}"]`)

afterEach(() => unmount())

describe('the topic picker', () => {
  it('is a labelled combobox that says it is closed', () => {
    const { field, page } = show()
    expect(page.querySelector(`label[for="${field.id}"]`)?.textContent).toBe('Topics')
    expect(field.getAttribute('aria-expanded')).toBe('false')
    expect(field.getAttribute('aria-activedescendant')).toBeNull()
  })

  it('narrows the list while typing and says how many are left', () => {
    const { field, page } = show()
    typeInto(field, 'wheat 2')
    expect(field.getAttribute('aria-expanded')).toBe('true')
    expect(document.getElementById(field.getAttribute('aria-controls') ?? '')?.getAttribute('role')).toBe('listbox')
    expect(options()[0]?.textContent).toContain('Wheat: tillering')
    typeInto(field, 'wheat 21')
    expect(options()).toHaveLength(1)
    expect(page.querySelector('[role=status]')?.textContent).toBe('1 topic')
  })

  it('takes the marked option with Enter and keeps the focus in the field', () => {
    const { field, page } = show()
    typeInto(field, 'wheat 21')
    press('ArrowDown')
    expect(active(field)?.textContent).toContain('first tiller')
    expect(press('Enter')).toBe(false)
    expect(chosen).toEqual(['wheat-21'])
    expect(field.value).toBe('')
    expect(document.activeElement).toBe(field)
    expect(page.querySelector('[role=status]')?.textContent).toBe('Wheat: first tiller added')
  })

  it('leaves Enter to the form when nothing is marked', () => {
    const { field } = show()
    typeInto(field, 'wheat 21')
    expect(press('Enter')).toBe(true)
    expect(chosen).toEqual([])
  })

  it('opens with Down on the first option, with Up on the last, and wraps', () => {
    const { field } = show()
    field.focus()
    press('ArrowDown')
    expect(active(field)).toBe(options()[0])
    press('ArrowUp')
    expect(active(field)).toBe(options().at(-1))
    press('ArrowDown')
    expect(active(field)).toBe(options()[0])
  })

  it('closes with Esc first and clears with the second', () => {
    const { field } = show()
    typeInto(field, 'boot')
    press('Escape')
    expect(field.getAttribute('aria-expanded')).toBe('false')
    expect(field.value).toBe('boot')
    press('Escape')
    expect(field.value).toBe('')
  })

  it('gives back a topic that is chosen again', () => {
    const { field } = show(['soil', 'wheat-21'])
    typeInto(field, 'wheat 21')
    expect(options()[0]?.getAttribute('aria-selected')).toBe('true')
    click(options()[0])
    expect(chosen).toEqual(['soil'])
  })

  it('steps back to the chips from the empty field and keeps the focus near what was removed', () => {
    const { field } = show(['soil', 'job-tillage', 'subject-water'])
    field.focus()
    press('Backspace')
    expect(document.activeElement).toBe(removal('subject-water'))
    expect(chosen).toHaveLength(3)
    press('Backspace')
    expect(chosen).toEqual(['soil', 'job-tillage'])
    expect(document.activeElement).toBe(removal('job-tillage'))
    press('ArrowLeft')
    expect(document.activeElement).toBe(removal('soil'))
    press('Delete')
    expect(chosen).toEqual(['job-tillage'])
    expect(document.activeElement).toBe(removal('job-tillage'))
    press('Delete')
    expect(chosen).toEqual([])
    expect(document.activeElement).toBe(field)
  })

  it('names what each chip button removes and shows a code it does not know as it is', () => {
    show(['rice-30', 'rice-31'])
    expect(removal('rice-30')?.getAttribute('aria-label')).toBe('Remove Rice: panicle initiation, green ring')
    expect(removal('rice-31')?.getAttribute('aria-label')).toBe('Remove rice-31')
  })

  it('says what to try when nothing fits', () => {
    const { field, page } = show()
    typeInto(field, 'zebra')
    expect(field.getAttribute('aria-expanded')).toBe('false')
    expect(page.textContent).toContain('No topic fits “zebra”')
  })
})
