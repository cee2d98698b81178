import { describe, expect, it } from 'vitest'
import { cautions, cautionsFor } from '@/lib/topics/cautions'
import { hazardousJobs } from '@/lib/topics/field-jobs'
import {
  crops,
  findTopics,
  stageKeys,
  stageOf,
  stageWord,
  topicByCode,
  topicMatches,
  topics,
  type Crop,
} from '@/lib/topics/rules'

/**
 * Source: U. Meier (ed.), Growth stages of mono- and dicotyledonous plants, BBCH Monograph, 2nd ed. 2001
 * (cereals and maize after Lancashire et al. 1991, Ann. Appl. Biol. 119:561-601; soybean Munger et al. 1997; cotton
 * Munger et al. 1998; potato Hack et al. 1993), read as transcribed in encyclopedia articles on each key.
 * Tomato and cotton above 65: from memory, to be held against the monograph.
 * Every two-digit code that the key lists; a-b is a run that the key prints as continuous.
 */
const published: Record<Crop, string> = {
  wheat:
    '00 01 03 05 06 07 09 10-19 20-29 30-36 37 39 41 43 45 47 49 51-59 61 65 69 71 73 75 77 83 85 87 89 92 93 97 99',
  maize: '00 01 03 05 06 07 09 10-19 30-39 51 53 55 59 61 63 65 67 69 71 73 75 79 83 85 87 89 97 99',
  rice: '00 01 03 05 06 07 09 10-19 21-29 30 32 34 37 39 41 43 45 47 49 51-59 61 65 69 71 73 75 77 83 85 87 89 92 97 99',
  soybean: '00 01 03 05-09 10-19 21-29 49 51 55 59 60-67 69 70 71 73 75 77 79 80-89 91-97 99',
  potato: '00-03 05 07-09 10-19 21-29 31-39 40-49 51 55 59 60 61 65 69 70-79 81 85 89 91 93 95 97 99',
  tomato: '00 01 03 05 07 09 10-19 21-29 51-59 61-69 71-79 81 85 89 97 99',
  cotton: '00 01 03 05-09 10-19 21-29 31-39 51 52 55 59 60 61 65 67 69 71-79 80-89 91-97 99',
}

function expand(list: string): string[] {
  return list.split(' ').flatMap((part) => {
    const [from = NaN, to = from] = part.split('-').map(Number)
    return Array.from({ length: to - from + 1 }, (_, i) => String(from + i).padStart(2, '0'))
  })
}

describe.each(crops)('the stage codes of %s', (crop) => {
  const mine = topics.filter((topic) => topic.crop === crop)

  it('are the published two-digit codes in order, each once, and no others', () => {
    const listed = mine.flatMap((topic) => (topic.bbch?.length === 2 ? [topic.bbch] : []))
    expect(listed).toEqual(expand(published[crop]))
  })

  it('have a principal stage exactly where a two-digit code stands under it', () => {
    const principals = mine.flatMap((topic) => (topic.bbch?.length === 1 ? [topic.bbch] : []))
    expect(principals).toEqual([...new Set(expand(published[crop]).map((code) => code[0]))])
  })

  it('name the crop in every label and no label twice', () => {
    const labels = mine.map((topic) => topic.label)
    expect(labels.filter((label) => !label.toLowerCase().startsWith(`${crop}: `))).toEqual([])
    expect(new Set(labels).size).toBe(labels.length)
  })
})

describe('gaps in the keys', () => {
  // Meier 2001: codes that stand between listed ones and yet do not exist.
  const gaps =
    'rice-20 rice-31 rice-33 rice-35 rice-36 rice-38 rice-40 rice-63 rice-67 maize-2 maize-21 maize-25 maize-4 maize-41 maize-49 maize-52 maize-57 maize-77 maize-92 wheat-02 wheat-04 wheat-08 wheat-38 wheat-42 wheat-63 wheat-79 wheat-81 wheat-95 soybean-02 soybean-3 soybean-31 soybean-41 soybean-68 soybean-72 potato-06 potato-20 potato-30 potato-63 potato-82 tomato-3 tomato-31 tomato-4 tomato-06 tomato-20 tomato-60 tomato-501 cotton-30 cotton-4 cotton-53 cotton-63'.split(
      ' ',
    )

  it.each(gaps)('%s is refused', (code) => expect(topicByCode(code)).toBeNull())
})

describe('topics', () => {
  it.each([
    ['wheat-21', 'first tiller'],
    ['wheat-39', 'ligule'],
    ['rice-30', 'panicle initiation'],
    ['maize-87', 'black layer'],
    ['soybean-09', 'emergence'],
    ['potato-40', 'tubers begin'],
    ['cotton-52', 'match head'],
  ])('%s is the stage that the key describes as %s', (code, words) => {
    expect(topicByCode(code)?.label).toContain(words)
  })

  it('have codes that are unique over stages, jobs and subjects', () => {
    expect(new Set(topics.map((topic) => topic.code)).size).toBe(topics.length)
  })

  it('draw a stage in the pattern of its first digit and leave jobs and subjects undrawn', () => {
    expect(topicByCode('wheat-21')).toMatchObject({ stage: '2', kind: 'stage', crop: 'wheat', bbch: '21' })
    expect(topicByCode('soil')).toMatchObject({ stage: 'soil', kind: 'stage', crop: null, bbch: null })
    expect(topicByCode('job-tillage')).toMatchObject({ stage: null, kind: 'job' })
    expect(topicByCode('subject-water')).toMatchObject({ stage: null, kind: 'subject' })
  })

  it('are unknown when empty, in other case, or like a property of every object', () => {
    for (const code of ['', 'Wheat-21', 'wheat', 'wheat-', 'constructor', '__proto__']) {
      expect(topicByCode(code)).toBeNull()
    }
  })

  it('have a word for every stage, with or without a crop', () => {
    for (const stage of stageKeys) {
      expect(stageWord(stage)).not.toBe('')
      for (const crop of crops) expect(stageWord(stage, crop)).not.toBe('')
    }
    expect(stageWord('2', 'wheat')).toBe('Tillering')
    expect(stageWord('7', 'cotton')).toBe('Bolls')
  })

  it('are drawn in the first stage among them', () => {
    expect(stageOf(['job-scouting', 'wheat-23', 'wheat-31'])).toBe('2')
    expect(stageOf(['subject-soil', 'soil'])).toBe('soil')
    expect(stageOf(['subject-soil'])).toBeNull()
    expect(stageOf([])).toBeNull()
  })
})

describe('a filter on a topic', () => {
  it.each([
    ['wheat-2', 'wheat-21', true],
    ['wheat-2', 'wheat-2', true],
    ['wheat-21', 'wheat-2', false],
    ['wheat-2', 'wheat-31', false],
    ['wheat-2', 'rice-21', false],
    ['soil', 'soil', true],
    ['soil', 'wheat-00', false],
    ['job-tillage', 'job-tillage', true],
    ['job-tillage', 'job-drilling', false],
    ['wheat-2', 'wheat-22x', false],
  ])('on %s against %s is %s', (filter, code, found) => expect(topicMatches(filter, code)).toBe(found))
})

describe('cautions', () => {
  it('stand for every hazardous job, and only for those', () => {
    const covered = new Set(cautions.flatMap((caution) => caution.jobs))
    expect([...covered].sort()).toEqual([...hazardousJobs].sort())
  })

  it('come once each for the jobs filed, with the rule they cite', () => {
    const found = cautionsFor(['job-grain-bin', 'job-drying', 'wheat-89'])
    expect(found.map((caution) => caution.key)).toEqual(['pto', 'lock-out', 'grain-bin', 'overhead-lines'])
    expect(found.every((caution) => caution.citation !== '')).toBe(true)
  })

  it('are none for a chapter that files no hazardous job', () => {
    expect(cautionsFor(['job-scouting', 'wheat-21', 'subject-safety'])).toEqual([])
  })
})

describe('typing for a topic', () => {
  const codes = (typed: string) => findTopics(typed).map((topic) => topic.code)

  it('finds a stage by crop and number, principal first', () => {
    expect(codes('wheat 2').slice(0, 3)).toEqual(['wheat-2', 'wheat-20', 'wheat-21'])
    expect(codes('WHEAT 21')).toEqual(['wheat-21'])
  })

  it('finds stages, jobs and subjects by the beginnings of their words, in any order', () => {
    expect(codes('grain bin')).toEqual(['job-grain-bin'])
    expect(codes('initiation rice')).toEqual(['rice-30'])
    expect(codes('wat')).toContain('subject-water')
    expect(codes('boot')).toEqual(expect.arrayContaining(['wheat-4', 'wheat-41', 'rice-45']))
  })

  it('offers principal stages, jobs and subjects before anything is typed, and nothing for a word that fits none', () => {
    expect(codes('  ')).toEqual(expect.arrayContaining(['soil', 'rice-3', 'job-harvest', 'subject-safety']))
    expect(codes('')).not.toContain('wheat-21')
    expect(codes('zebra')).toEqual([])
    expect(codes('.*')).toEqual(codes(''))
  })
})
