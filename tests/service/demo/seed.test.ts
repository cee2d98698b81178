import { beforeAll, describe, expect, it } from 'vitest'
import { passwordFits } from '@/lib/auth/passwords'
import { seedDemo } from '@/lib/demo/seed-demo'
import { demoPassword, people } from '@/lib/demo/story/people'
import { filmed } from '@/lib/demo/story/story'
import { readEpisode } from '@/lib/episodes/reads'
import { nobody } from '@/lib/auth/actor'
import { CaptionTrack } from '@/models/caption-track'
import { Channel } from '@/models/channel'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Membership } from '@/models/membership'
import { Question } from '@/models/question'
import { QuestionEvent } from '@/models/question-event'
import { Reading } from '@/models/reading'
import { Season } from '@/models/season'
import { Term } from '@/models/term'
import { User } from '@/models/user'
import { freshDatabase } from '../../support/database'
import { waitingJobs } from '../../support/jobs'

freshDatabase()

const said: string[] = []
beforeAll(async () => {
  await seedDemo((line) => said.push(line))
}, 240_000)

describe('seeding the demo', () => {
  it('says what it is doing, film by film', () => {
    expect(said.filter((line) => line.startsWith('Voices:'))).toHaveLength(filmed.length)
  })

  it('gives each listed person the demo password, and nobody else any', async () => {
    const users = await User.findAll()
    for (const { email, signsIn } of people) {
      const user = users.find((one) => one.email === email)
      expect(user?.passwordHash !== null, email).toBe(signsIn)
    }
    const june = users.find((one) => one.email === 'june@reader.example')
    expect(await passwordFits(june?.passwordHash, demoPassword)).toBe(true)
    expect(await passwordFits(june?.passwordHash, 'turnrow-demo-2025')).toBe(false)
    expect(users.filter((one) => one.isAdmin).map((one) => one.email)).toEqual(['admin@turnrow.example'])
    expect(await Membership.count()).toBe(4)
  })

  it('makes both channels with seasons, and ten episodes of which eight are published in the past', async () => {
    expect(await Channel.count()).toBe(2)
    expect(await Season.count()).toBe(3)
    expect(await Episode.count()).toBe(10)
    const published = await Episode.findAll({ where: { state: 'published' } })
    expect(published).toHaveLength(8)
    for (const episode of published) expect(episode.publishedAt?.getTime()).toBeLessThan(Date.now())
    for (const state of ['draft', 'withdrawn']) expect(await Episode.count({ where: { state } })).toBe(1)
  })

  it('has captions, chapters and readings on every published episode, readable by nobody in particular', async () => {
    for (const { id } of await Episode.findAll({ where: { state: 'published' } })) {
      const view = await readEpisode(nobody, id)
      expect(view.chapters.length).toBeGreaterThanOrEqual(2)
      expect(view.captions.map((track) => track.language)).toEqual(['en'])
      expect(view.readings.length).toBeGreaterThan(0)
      expect(view.footage?.state).toBe('receiving')
    }
  })

  it('says every reading while a caption stands, in a number that the caption names', async () => {
    const tracks = await CaptionTrack.findAll()
    for (const reading of await Reading.findAll()) {
      const track = tracks.find((one) => one.episodeId === reading.episodeId)
      const cue = await Cue.findOne({ where: { trackId: track?.id ?? '', startMs: reading.atMs } })
      expect(cue, `${reading.quantity} at ${reading.atMs}`).not.toBeNull()
    }
  })

  it('asks nine questions with a history that ends in the state they stand in', async () => {
    const questions = await Question.findAll()
    expect(questions).toHaveLength(9)
    for (const question of questions) {
      const events = await QuestionEvent.findAll({ where: { questionId: question.id }, order: [['createdAt', 'asc']] })
      expect(events[0]?.move).toBe('ask')
      expect(events.at(-1)?.toState, question.title).toBe(question.state)
      expect(events[0]?.createdAt.toISOString().slice(0, 10)).toBe(question.createdAt.toISOString().slice(0, 10))
    }
  })

  it('turns an answered question to the very second of its follow-up', async () => {
    const first = await Episode.findOne({ where: { slug: 'is-this-wheat-stand-worth-keeping' }, rejectOnEmpty: true })
    const view = await readEpisode(nobody, first.id)
    const asked = view.questions.find((one) => one.title.startsWith('Do dead tillers'))
    // Three of their own, and one who asked the question that was joined to this one.
    expect(asked?.asking).toBe(4)
    expect(asked?.followUp?.number).toBe(5)
    expect(asked?.followUp?.end ?? 0).toBeGreaterThan(asked?.followUp?.start ?? Infinity)
  })

  it('queues one drawing for each film, and the letters of nobody', async () => {
    const drawings = await waitingJobs('demo.draw')
    const footages = await Footage.findAll()
    expect(drawings.map(({ data }) => data.footageId).sort()).toEqual(footages.map(({ id }) => id).sort())
    expect(footages).toHaveLength(8)
    expect(await waitingJobs('mail.send')).toEqual([])
  })

  it('brings the handbook in, and changes nothing when it is run again', async () => {
    expect(await Term.count()).toBeGreaterThanOrEqual(25)
    expect(await seedDemo(() => undefined)).toBe(false)
    expect(await Episode.count()).toBe(10)
    expect(await User.count()).toBe(people.length)
  })
})
