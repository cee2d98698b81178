import { describe, expect, it } from 'vitest'
import { cautionsOf } from '@/lib/questions/hazard-rules'
import { answeredLetter } from '@/lib/questions/letters'
import { shareOfWords } from '@/lib/questions/word-rules'

describe('cautions of a question', () => {
  const keys = (title: string, topics: string[] = []) => cautionsOf({ title, body: '' }, topics).map(({ key }) => key)

  it.each([
    ['Can I weld a cracked drum?', 'tanks'],
    ['How do you sample a bin for moisture?', 'grain-bin'],
    ['Which herbicide after the first trifoliate?', 'pesticides'],
    ['Is anhydrous safe near tile?', 'ammonia'],
    ['What guards a PTO stub?', 'pto'],
    ['Who does the wiring of your fan?', 'lock-out'],
    ['How close to power lines may the auger go?', 'overhead-lines'],
  ])('“%s” carries the caution “%s”', (title, key) => {
    expect(keys(title)).toContain(key)
  })

  it('come from the chapters it was asked and answered in as well', () => {
    expect(keys('What is that noise?', ['job-grain-bin'])).toContain('grain-bin')
  })

  it('do not stand at questions that hurt nobody', () => {
    expect(keys('What hoop size do you use in narrow rows?', ['wheat-21', 'job-scouting'])).toEqual([])
    expect(keys('Does the combine of colours matter?')).toEqual([])
  })
})

describe('the share of words that two texts have in common', () => {
  it.each([
    ['rolling beans', 'roll the bean field', 1],
    ['rolling beans early', 'roll the bean field', 0.67],
    ['how is it', 'how is it', 0],
    ['pods', '', 0],
  ])('of “%s” in “%s” is %s', (asked, text, share) => {
    expect(shareOfWords(asked, text)).toBe(share)
  })
})

describe('the letter that a question came back', () => {
  const about = {
    name: 'June <b>P.</b>',
    asked: 'Do dead tillers count & why?',
    askedIt: true,
    title: 'Do dead tillers count & why?',
    channel: 'Alder Fork Farm',
    episode: { number: 11, title: 'The first node' },
    start: 125.9,
    text: 'Count the plant.\nA white crown makes new tillers.',
    watchUrl: 'https://turnrow.example/channels/alder-fork/episodes/first-node?t=125.9',
    questionUrl: 'https://turnrow.example/questions/1',
  }

  it('names the minute without rounding it up, and links to the very second', () => {
    const { subject, text } = answeredLetter(about)
    expect(subject).toBe('Answered at 2:05: Do dead tillers count & why?')
    expect(text).toContain('in episode 11, “The first node”, at 2:05.')
    expect(text).toContain(`Watch the answer at 2:05:\n${about.watchUrl}\n`)
  })

  it('keeps the signs of people’s text from becoming markup', () => {
    const { html, text } = answeredLetter(about)
    expect(html).not.toContain('<b>')
    expect(html).toContain('Hello June &#60;b&#62;P.&#60;/b&#62;,')
    expect(text).toContain('Hello June <b>P.</b>,')
  })
})
