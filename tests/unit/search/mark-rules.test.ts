import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { cutAround, markWords, piecesOf, spokenSnippet, withoutMarks } from '@/lib/search/mark-rules'
import { MARK_CLOSE, MARK_OPEN } from '@/lib/search/rules'

const mark = (text: string) => text.replaceAll('[', MARK_OPEN).replaceAll(']', MARK_CLOSE)

describe('taking marks out of a text', () => {
  it('leaves the text and says where they were', () => {
    expect(withoutMarks(mark('the [hoop] lands'))).toEqual({ text: 'the hoop lands', marks: [[4, 8]] })
  })

  it('drops a mark without its partner and an empty one', () => {
    expect(withoutMarks(mark('a] [b'))).toEqual({ text: 'a b', marks: [] })
    expect(withoutMarks(mark('a[]b'))).toEqual({ text: 'ab', marks: [] })
  })

  it('puts the pieces back together to the same text, whatever it holds', () => {
    const text = fc.string({ unit: fc.constantFrom('a', ' ', '<', MARK_OPEN, MARK_CLOSE, 'é', '😀') })
    fc.assert(
      fc.property(text, (marked) => {
        const plain = withoutMarks(marked)
        expect(
          piecesOf(plain)
            .map((piece) => piece.text)
            .join(''),
        ).toBe(plain.text)
      }),
    )
  })
})

it('words that begin as sought are marked, without case and accents', () => {
  expect(markWords('Tillering, till; está <b>till</b>', ['till', 'est'])).toBe(
    mark('[Tillering], [till]; [está] <b>[till]</b>'),
  )
})

describe('a spoken snippet', () => {
  it('begins with the sentence that holds most of the found words, the first of several', () => {
    const spoken = [
      'Good morning.',
      mark('The [hoop] lands.'),
      mark('Throw the [hoop] over your [shoulder].'),
      'Then count.',
    ]
    expect(spokenSnippet(spoken)).toEqual({
      sentence: 2,
      text: 'Throw the hoop over your shoulder. Then count.',
      marks: [
        [10, 14],
        [25, 33],
      ],
    })
  })

  it('is the beginning where only the title was found, and nothing where nothing is said', () => {
    expect(spokenSnippet(['Good morning.', 'Count.'])).toMatchObject({ sentence: 0, text: 'Good morning. Count.' })
    expect(spokenSnippet([])).toEqual({ sentence: 0, text: '', marks: [] })
  })

  it('stops at a sentence when it is long enough', () => {
    const long = `${'word '.repeat(29)}end.`
    expect(spokenSnippet([long, long]).text).toBe(long)
  })
})

it('a longer text is cut around its first found word', () => {
  const words = Array.from({ length: 100 }, (_, n) => `w${n}`)
  words[50] = mark('[w50]')
  const cut = cutAround(words.join(' '))
  expect(cut.startsWith('… w44 ')).toBe(true)
  expect(cut.endsWith('w79 …')).toBe(true)
  expect(cutAround('short')).toBe('short')
})
