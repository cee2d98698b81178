import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'
import { MarkedText } from '@/components/search/marked-text'
import { ResultRow } from '@/components/search/result-row'
import type { SearchItem } from '@/lib/search/schema'

const item: SearchItem = {
  id: 'passage-1',
  kind: 'passage',
  title: 'Throwing <b>the</b> hoop',
  snippet: 'Toss <img src=x onerror=alert(1)> the hoop',
  marks: [[5, 33]],
  url: '/channels/alder/episodes/stand?t=160',
  episode: { id: 'e', number: 9, title: 'Worth it?', url: '/x', channel: { slug: 'alder', name: 'Alder Fork Farm' } },
  start: 160,
  end: 220,
  stage: '2',
  crop: 'wheat',
}

describe('a result', () => {
  it('says what it is, where it is from, its second and its stage, and leads to that second', () => {
    const html = renderToStaticMarkup(<ResultRow item={item} />)
    for (const part of [
      'Passage',
      'Alder Fork Farm, episode 9',
      '2:40',
      'opens at 2 minutes 40 seconds',
      'Wheat, tillering',
    ]) {
      expect(html).toContain(part)
    }
    expect(html).toContain('href="/channels/alder/episodes/stand?t=160"')
  })

  it('sets hostile words as words, marked or not', () => {
    const html = renderToStaticMarkup(<ResultRow item={item} />)
    expect(html).not.toMatch(/<img|<b>/)
    expect(html).toContain('&lt;img src=x onerror=alert(1)&gt;</mark>')
  })

  it('of a waiting question has a pennant and no second', () => {
    const html = renderToStaticMarkup(
      <ResultRow item={{ ...item, kind: 'question', state: 'queued', start: undefined, episode: undefined }} />,
    )
    expect(html).toContain('waiting for its answer')
    expect(html).not.toContain('<time')
  })
})

it('marks stand where they are said to be', () => {
  expect(renderToStaticMarkup(<MarkedText text="a hoop b" marks={[[2, 6]]} />)).toMatch(
    /^a <mark [^>]*>hoop<\/mark> b$/,
  )
})
