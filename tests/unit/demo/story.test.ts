import { describe, expect, it } from 'vitest'
import { frameAt } from '@/lib/demo/draw-films'
import { cutSheet, momentOf } from '@/lib/demo/cut-sheet'
import { channels } from '@/lib/demo/story/channels'
import { people } from '@/lib/demo/story/people'
import { questions } from '@/lib/demo/story/questions'
import { plantings } from '@/lib/demo/story/seasons'
import { episodes, filmed, phrasesOf } from '@/lib/demo/story/story'
import type { StoryEpisode } from '@/lib/demo/story/types'
import { stageOf, topicByCode } from '@/lib/topics/rules'

/** A cut sheet without a synthesiser: every phrase takes as long as its letters at a speaking pace. */
const pacedSheet = (episode: StoryEpisode) =>
  cutSheet(
    episode,
    'nell',
    phrasesOf(episode).map(({ text }) => text.length * 62),
  )

const episodeOf = (key: string) => {
  const episode = filmed.find((one) => one.key === key)
  if (!episode) throw new Error(`no film is called ${key}`)
  return episode
}

describe('the films of the demo', () => {
  it('are eight, six on one channel and two on the other, and last 20 to 90 seconds', () => {
    expect(filmed.map((episode) => episode.channel).sort()).toEqual([
      ...Array<string>(6).fill('alder-fork'),
      ...Array<string>(2).fill('terrace-nine'),
    ])
    for (const episode of filmed) {
      const { durationMs } = pacedSheet(episode)
      expect(durationMs, episode.key).toBeGreaterThan(20_000)
      expect(durationMs, episode.key).toBeLessThan(90_000)
    }
  })

  it('file every chapter under codes of the vocabulary, at least one stage or job each', () => {
    for (const chapter of filmed.flatMap((episode) => episode.chapters)) {
      expect(chapter.topics.length, chapter.title).toBeGreaterThan(0)
      for (const code of chapter.topics) expect(topicByCode(code), code).not.toBeNull()
    }
  })

  it('show at least six growth stages of all four crops', () => {
    const codes = filmed.flatMap((episode) => episode.chapters.map((chapter) => chapter.topics))
    expect(new Set(codes.map(stageOf).filter(Boolean)).size).toBeGreaterThanOrEqual(6)
    const crops = new Set(codes.flat().flatMap((code) => topicByCode(code)?.crop ?? []))
    expect([...crops].sort()).toEqual(['maize', 'rice', 'soybean', 'wheat'])
  })

  it('speak the caution wherever a chapter is filed under a job that can hurt', () => {
    const spoken: Record<string, RegExp> = {
      'job-harvest': /off and still before anyone clears/,
      'job-grain-bin': /Lock out the auger, test the air/,
      'job-levees': /keep out of it/,
    }
    for (const chapter of filmed.flatMap((episode) => episode.chapters)) {
      for (const code of chapter.topics.filter((one) => topicByCode(one)?.hazardous)) {
        const caution = spoken[code]
        expect(caution, `${code} in ${chapter.title}`).toBeDefined()
        expect(chapter.lines.map((line) => line.text).join(' ')).toMatch(caution ?? /never/)
      }
    }
  })

  it('have a picture for every moment, also before the first and after the last sentence', () => {
    for (const episode of filmed) {
      const sheet = pacedSheet(episode)
      for (const ms of [0, ...sheet.cues.flatMap((cue) => [cue.startMs, cue.endMs]), sheet.durationMs - 1]) {
        expect(frameAt(episode, sheet, ms)).not.toMatch(/NaN|undefined|Infinity/)
      }
    }
  })

  it('break captions so that two lines of 37 letters hold them', () => {
    for (const { text } of filmed.flatMap(phrasesOf)) expect(text.length, text).toBeLessThanOrEqual(74)
  })

  it('keep sentences in order, inside their chapters, with silence between them', () => {
    for (const episode of filmed) {
      const { cues, chapters, durationMs } = pacedSheet(episode)
      expect(chapters[0]?.startMs).toBe(0)
      expect(chapters.at(-1)?.endMs).toBe(durationMs)
      for (const [index, cue] of cues.entries()) {
        const chapter = chapters[cue.chapter]
        expect(cue.startMs).toBeGreaterThanOrEqual(chapter?.startMs ?? Infinity)
        expect(cue.endMs).toBeLessThanOrEqual(chapter?.endMs ?? 0)
        expect(cues[index + 1]?.startMs ?? Infinity).toBeGreaterThan(cue.endMs)
      }
    }
  })
})

describe('the rest of the demo', () => {
  it('has nine questions in every state, asked by invented people at reserved addresses', () => {
    expect(questions).toHaveLength(9)
    expect(new Set(questions.map((question) => question.state))).toEqual(
      new Set(['new', 'queued', 'booked', 'answered', 'set-aside', 'joined']),
    )
    expect(people.every(({ email }) => email.endsWith('.example'))).toBe(true)
    const known = new Set(people.map((person) => person.key))
    for (const { asker, alsoAsking } of questions) {
      for (const key of [asker, ...alsoAsking]) expect(known, key).toContain(key)
      expect(alsoAsking).not.toContain(asker)
    }
  })

  it('asks questions at sentences that are said, and answers them in an episode published later', () => {
    for (const question of questions) {
      const asked = question.at && episodeOf(question.at.episode)
      if (asked && question.at) {
        expect(momentOf(pacedSheet(asked), question.at.line).startMs).toBeGreaterThan(0)
        expect(question.askedOn >= (asked.publishedOn ?? '')).toBe(true)
      }
      if (!question.answer) continue
      const answering = episodeOf(question.answer.episode)
      const sheet = pacedSheet(answering)
      expect((answering.publishedOn ?? '') > question.askedOn).toBe(true)
      expect(momentOf(sheet, question.answer.to).endMs).toBeGreaterThan(momentOf(sheet, question.answer.from).startMs)
    }
  })

  it('numbers the episodes of a channel without gaps, in the order of filming', () => {
    for (const { slug } of channels) {
      const own = episodes.filter((one) => one.channel === slug).sort((a, b) => a.number - b.number)
      expect(own.map((one) => one.number)).toEqual(own.map((_, index) => index + 1))
      const days = own.map((one) => one.filmedOn)
      expect(days).toEqual([...days].sort())
    }
  })

  it('films each episode while a planting of its crop stands in a stage that it shows', () => {
    for (const episode of filmed) {
      const stages = episode.chapters.flatMap((chapter) => chapter.topics.map(topicByCode))
      const standing = plantings
        .filter((one) => one.channel === episode.channel)
        .flatMap((one) =>
          one.periods
            .filter(({ from, to }) => from <= episode.filmedOn && episode.filmedOn <= to)
            .map(({ stage }) => stage),
        )
      expect(
        stages.some((topic) => topic?.stage && standing.includes(topic.stage)),
        episode.key,
      ).toBe(true)
    }
  })

  it('lays stage windows one after another without overlap', () => {
    for (const { periods, crop } of plantings) {
      for (const [index, period] of periods.entries()) {
        expect(period.from <= period.to, `${crop} ${period.stage}`).toBe(true)
        const next = periods[index + 1]
        if (next) expect(next.from > period.to).toBe(true)
      }
    }
  })
})
