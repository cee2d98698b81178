// @vitest-environment jsdom
import { renderToStaticMarkup } from 'react-dom/server'
import type { ReactNode } from 'react'
import { describe, expect, it } from 'vitest'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { TextField } from '@/components/ui/field'
import { Notice } from '@/components/ui/notice'
import { Progress } from '@/components/ui/progress'
import { Select } from '@/components/ui/select'
import { StagePatch } from '@/components/ui/stage-patch'
import { StagePatterns } from '@/components/ui/stage-patterns'
import { StageTag } from '@/components/ui/tag'
import { stageKeys, stageWord } from '@/lib/topics/stage-words'

function drawn(what: ReactNode): HTMLElement {
  document.body.innerHTML = renderToStaticMarkup(what)
  return document.body
}

const found = <T extends Element>(selector: string): T => {
  const element = document.querySelector<T>(selector)
  if (!element) throw new Error(`no ${selector}`)
  return element
}

/** What a screen reader adds to the name: the texts that aria-describedby points at. */
const description = (control: Element) =>
  (control.getAttribute('aria-describedby') ?? '')
    .split(' ')
    .map((id) => document.getElementById(id)?.textContent)
    .join(' ')

describe('a field', () => {
  it.each([
    ['text', <TextField key="t" label="Area" hint="In acres" error="Above 0" />, 'input'],
    ['choice', <Select key="s" label="Area" hint="In acres" error="Above 0" options={[]} />, 'select'],
    ['tick', <Checkbox key="c" label="Area" hint="In acres" error="Above 0" />, 'input'],
  ])('of %s is named by its label, and its hint and its error are read with it', (_kind, field, selector) => {
    drawn(field)
    const control = found<HTMLInputElement>(selector)
    expect(control.labels?.[0]?.textContent).toBe('Area')
    expect(description(control)).toBe('In acres Above 0')
    expect(control.getAttribute('aria-invalid')).toBe('true')
  })

  it('without an error is not marked as wrong and points at nothing that is not there', () => {
    drawn(<TextField label="Area" />)
    expect(found('input').hasAttribute('aria-invalid')).toBe(false)
    expect(found('input').hasAttribute('aria-describedby')).toBe(false)
  })

  it('keeps its own id beside others of the same label', () => {
    drawn(
      <>
        <TextField label="Area" />
        <TextField label="Area" />
      </>,
    )
    const ids = [...document.querySelectorAll('input')].map(({ id }) => id)
    expect(new Set(ids).size).toBe(2)
  })
})

describe('a stage', () => {
  it('always stands as a pattern and a word, and the pattern alone is silent', () => {
    for (const stage of stageKeys) {
      const tag = drawn(<StageTag stage={stage} crop="wheat" />)
      expect(tag.textContent).toBe(stageWord(stage, 'wheat'))
      expect(found('svg').getAttribute('aria-hidden')).toBe('true')
    }
  })

  it('has a pattern of its own, not only a colour', () => {
    const page = drawn(<StagePatterns />)
    const tiles = [...page.querySelectorAll('pattern')].map((pattern) => pattern.innerHTML)
    expect(new Set(tiles).size).toBe(stageKeys.length)
  })

  it('says its word itself where none stands beside it', () => {
    drawn(<StagePatch stage="6" label="Flowering" />)
    expect(found('svg').getAttribute('role')).toBe('img')
    expect(found('svg').getAttribute('aria-label')).toBe('Flowering')
  })

  it('draws from the one pattern that every page carries, which is never hidden', () => {
    const page = drawn(
      <>
        <StagePatterns />
        {stageKeys.map((stage) => (
          <StagePatch key={stage} stage={stage} />
        ))}
      </>,
    )
    const ids = [...page.querySelectorAll('pattern')].map(({ id }) => id)
    const used = [...page.querySelectorAll('svg > rect')].map((rect) => rect.getAttribute('fill'))
    expect(used).toEqual(ids.map((id) => `url(#${id})`))
    expect(page.querySelector('svg')?.getAttribute('class')).not.toContain('hidden')
  })
})

describe('what happened', () => {
  it('interrupts only when it failed', () => {
    drawn(
      <>
        <Notice title="Saved" />
        <Notice tone="failed" title="Not saved" />
      </>,
    )
    expect(found('[role=status]').textContent).toBe('Saved')
    expect(found('[role=alert]').textContent).toBe('Not saved')
  })

  it('is told of long work in per cent, and as running when nobody knows how long', () => {
    drawn(<Progress value={0.424} label="Sending the film" />)
    expect(found('[role=progressbar]').getAttribute('aria-valuenow')).toBe('42')
    drawn(<Progress label="Looking at the film" />)
    expect(found('[role=progressbar]').hasAttribute('aria-valuenow')).toBe(false)
  })
})

describe('a button', () => {
  it('stays focusable while it works, says what it does, and sends no form twice', () => {
    drawn(
      <Button type="submit" busy="Saving">
        Save
      </Button>,
    )
    const button = found<HTMLButtonElement>('button')
    expect(button.textContent).toBe('Saving…')
    expect([button.type, button.disabled, button.getAttribute('aria-disabled')]).toEqual(['button', false, 'true'])
  })

  it('does nothing to a form unless it is meant to', () => {
    drawn(<Button>Remove</Button>)
    expect(found<HTMLButtonElement>('button').type).toBe('button')
  })
})
