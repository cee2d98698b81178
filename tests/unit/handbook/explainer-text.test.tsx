// @vitest-environment jsdom
import { afterEach, describe, expect, it } from 'vitest'
import { ClaimTable } from '@/components/handbook/claim-table'
import { ExplainerText } from '@/components/handbook/explainer-text'
import { JsonLd } from '@/components/ui/json-ld'
import type { ClaimView } from '@/lib/handbook/views'
import { render } from '../../support/render'

const claim: ClaimView = {
  key: 'rate',
  statement: 'The rate that follows.',
  quantity: 'seeding rate',
  low: 121,
  high: 121,
  unit: 'lb/ac',
  source: {
    key: 's',
    title: 'A leaflet',
    authors: ['Moss, A.'],
    publisher: null,
    year: 2015,
    url: 'https://x.example/',
  },
  locator: 'Table 2',
  basis: 'publication opened',
  verdict: 'agrees',
  note: null,
  checkedBy: 'an adviser',
  checkedOn: '2026-11-03',
}

let unmount = () => {}
afterEach(() => unmount())

function show(body: string, claims = [claim]) {
  const shown = render(
    <>
      <ExplainerText body={body} claims={claims} />
      <ClaimTable claims={claims} />
    </>,
  )
  unmount = shown.unmount
  return shown.page
}

describe('an explainer’s text', () => {
  it('leads from each figure to the note it is from', () => {
    const page = show('Sow {{claim:rate}} here.')
    const link = page.querySelector('.prose a')
    expect(link?.textContent).toBe('121\u00a0lb/ac')
    expect(page.querySelector(link?.getAttribute('href') ?? 'none')?.textContent).toContain('The rate that follows.')
  })

  it.each([
    '<script>window.__x = 1</script>',
    '<img src=x onerror="window.__x=1">',
    '[a](javascript:window.__x=1)',
    '![a](https://elsewhere.example/pixel.gif)',
    '[a](data:text/html,<script>1</script>)',
    '<a href="vbscript:x">a</a>',
    '[a](java\tscript:alert(1))',
    '<iframe src="https://elsewhere.example"></iframe>',
    '<svg onload=alert(1)>',
  ])('makes nothing that runs or fetches out of %s', (body) => {
    const page = show(`Before ${body} between.\n\nThe end.`, [])
    expect(page.querySelectorAll('script, img, iframe, svg, object, [onerror], [onload]')).toHaveLength(0)
    for (const link of page.querySelectorAll('a')) {
      expect(link.getAttribute('href')).not.toMatch(/^\s*(javascript|data|vbscript):/i)
    }
    expect(page.textContent).toContain('The end.')
  })

  it('sets no second h1 on the page', () => {
    expect(show('# Big').querySelector('h1')).toBeNull()
  })

  it('reads thousands of brackets and stars to the end', () => {
    expect(show(`${'['.repeat(3000)} ${'*'.repeat(3000)}\n\ndone`, []).textContent).toContain('done')
  })
})

describe('a claim’s note', () => {
  const words = (given: Partial<ClaimView>) => show('', [{ ...claim, ...given }]).querySelector('li')?.textContent

  it.each([
    '121\u00a0lb/ac',
    'seeding rate',
    'Moss, A. 2015',
    'A leaflet',
    'Table 2',
    'Agrees with the publication',
    'by an adviser on',
    '3 November 2026',
  ])('says “%s”', (part) => expect(words({})).toContain(part))

  it('says plainly that a figure is from memory, and that its source is still to be opened', () => {
    const told = words({ basis: 'from memory', verdict: null, checkedBy: null, checkedOn: null })
    expect(told).toContain('From memory; no publication opened yet')
    expect(told).toContain('To be held against: Moss, A. 2015')
    expect(told).not.toMatch(/agrees/i)
  })

  it('makes no link of an address that a browser should not open', () => {
    const source = { key: 's', title: 'A leaflet', authors: [], publisher: null, year: null }
    const page = show('', [{ ...claim, source: { ...source, url: 'javascript:alert(1)' } }])
    expect(page.querySelector('a')).toBeNull()
    expect(page.textContent).toContain('A leaflet')
  })
})

describe('structured data', () => {
  it('cannot be ended by a text in it and reads back the same', () => {
    const data = { name: '</script><script>window.__x=1</script>' }
    const shown = render(<JsonLd data={data} />)
    unmount = shown.unmount
    const html = shown.page.querySelector('script')?.innerHTML ?? ''
    expect(html).not.toContain('<')
    expect(JSON.parse(html)).toEqual(data)
  })
})
