import { beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { inTransaction } from '@/lib/db'
import { goPublic } from '@/lib/episodes/go-public'
import { Episode } from '@/models/episode'
import { Letter } from '@/models/letter'
import { Question } from '@/models/question'
import { Verdict } from '@/models/verdict'
import { makeEpisode, makeFilm, makeQuestion, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'
import { type Farm, look, makeFarm, move, startAsking, stopAsking } from '../support/questions'

freshDatabase()

let farm: Farm
let episode: Episode
let question: Question
beforeAll(async () => {
  farm = await makeFarm()
})
beforeEach(async () => {
  episode = await makeEpisode(farm.channel)
  await makeFilm(episode, 300_000)
  question = await makeQuestion(farm.channel, farm.asker)
})

const answer = (given: object = {}) =>
  move('answer', question.id, farm.owner.id, {
    episodeId: episode.id,
    start: 125.5,
    end: 140,
    text: 'Early & dry.',
    ...given,
  })

/** Publishes as the button and the clock do: the episode's row is held, and what follows is in the same transaction. */
const publish = (id = episode.id) =>
  inTransaction(async (transaction) => {
    const row = await Episode.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE, rejectOnEmpty: true })
    if (row.state !== 'published') await goPublic(row, transaction)
  })

const lettersAbout = async (id = question.id) =>
  (await Letter.findAll({ order: ['key'] })).filter(({ key }) => key.startsWith(`answered:${id}:`))
const stateOf = async (id = question.id) => (await Question.findByPk(id, { rejectOnEmpty: true })).state

describe('when an episode is published', () => {
  it('its answered questions come back to everybody asking, one letter each, at the second', async () => {
    await startAsking(question.id, farm.viewer.id)
    const left = await makeUser({ disabledAt: new Date() })
    const { Asking } = await import('@/models/asking')
    await Asking.create({ questionId: question.id, userId: left.id })
    await answer()
    await publish()

    expect(await stateOf()).toBe('answered')
    const letters = await lettersAbout()
    expect(letters.map(({ toAddress }) => toAddress).sort()).toEqual([farm.asker.email, farm.viewer.email].sort())
    const link = `http://localhost:3999/channels/${farm.channel.slug}/episodes/${episode.slug}?t=125.5`
    for (const letter of letters) {
      expect(letter.text).toContain(link)
      expect(letter.text).toContain('at 2:05')
      expect(letter.html).toContain(`href="${link}"`)
      expect(letter.html).toContain('Early &#38; dry.')
      expect(letter.subject).toBe(`Answered at 2:05: ${question.title}`)
    }
    expect(letters.find(({ toAddress }) => toAddress === farm.asker.email)?.text).toContain('You asked')
    expect(letters.find(({ toAddress }) => toAddress === farm.viewer.email)?.text).toContain('You are also asking')
    const mail = (await waitingJobs('mail.send')).map(({ data }) => data.id)
    for (const { id } of letters) expect(mail).toContain(id)
    expect(await (await look(question.id)).json()).toMatchObject({ followUp: { start: 125.5, number: episode.number } })
  })

  it('publishing twice, also at the same time, writes each letter once', async () => {
    await answer()
    await Promise.all([publish(), publish(), publish()])
    await publish()
    expect(await lettersAbout()).toHaveLength(1)
  })

  it('publishing again after a withdrawal writes to nobody again, and the question stays answered in between', async () => {
    await answer()
    await publish()
    await Episode.update({ state: 'withdrawn' }, { where: { id: episode.id } })
    expect(await (await look(question.id)).json()).toMatchObject({ state: 'answered', followUp: null })
    await publish()
    expect(await lettersAbout()).toHaveLength(1)
    expect(await (await look(question.id)).json()).toMatchObject({ followUp: { start: 125.5 } })
  })

  it('what was booked on it without an answer goes back to the queue', async () => {
    await move('book', question.id, farm.owner.id, { episodeId: episode.id })
    await publish()
    expect(await stateOf()).toBe('queued')
    expect(await lettersAbout()).toEqual([])
  })

  it('people of joined questions hear of it too, in the words they asked it', async () => {
    const joined = await makeQuestion(farm.channel, farm.viewer, { title: 'Is it too late to roll?' })
    await startAsking(joined.id, farm.asker.id)
    await move('join', joined.id, farm.owner.id, { into: question.id })
    await answer()
    await publish()
    const letters = await lettersAbout()
    expect(letters).toHaveLength(2)
    const theirs = letters.find(({ toAddress }) => toAddress === farm.viewer.email)
    expect(theirs?.subject).toBe('Answered at 2:05: Is it too late to roll?')
    expect(theirs?.text).toContain(`It went together with the question “${question.title}”.`)
    expect(await stateOf(joined.id)).toBe('joined')
  })

  it('a question joined while it happens is not forgotten', async () => {
    const joined = await makeQuestion(farm.channel, farm.viewer)
    await answer()
    const [, response] = await Promise.all([publish(), move('join', joined.id, farm.owner.id, { into: question.id })])
    expect(response.status).toBe(200)
    expect((await lettersAbout()).map(({ toAddress }) => toAddress).sort()).toEqual(
      [farm.asker.email, farm.viewer.email].sort(),
    )
  })

  it('a booking made while it happens does not get stuck on a published episode', async () => {
    await Promise.all([publish(), move('book', question.id, farm.owner.id, { episodeId: episode.id })])
    expect(['new', 'queued']).toContain(await stateOf())
  })

  it('nothing of it remains when the transaction fails', async () => {
    await answer()
    const failing = inTransaction(async (transaction) => {
      const row = await Episode.findByPk(episode.id, { transaction, rejectOnEmpty: true })
      await goPublic(row, transaction)
      throw new Error('the power went')
    })
    await expect(failing).rejects.toThrow('the power went')
    expect(await stateOf()).toBe('booked')
    expect(await lettersAbout()).toEqual([])
  })
})

describe('an answer on an episode that is published already', () => {
  beforeEach(() => publish())

  it('answers at once, and mending it writes no second letter', async () => {
    expect(await (await answer()).json()).toMatchObject({ state: 'answered', followUp: { start: 125.5 } })
    expect(await (await answer({ start: 126, text: 'Dry.' })).json()).toMatchObject({
      followUp: { start: 126, text: 'Dry.' },
    })
    expect(await lettersAbout()).toHaveLength(1)
    const other = await makeEpisode(farm.channel)
    expect((await answer({ episodeId: other.id })).status).toBe(409)
  })

  it('reaches whoever is joined to it afterwards', async () => {
    await answer()
    const late = await makeQuestion(farm.channel, farm.viewer)
    await move('join', late.id, farm.owner.id, { into: question.id })
    expect((await lettersAbout()).map(({ toAddress }) => toAddress)).toContain(farm.viewer.email)
  })
})

describe('the verdict', () => {
  const verdict = (as: string | undefined, body: object) => move('verdict', question.id, as, body)

  it('is for those who ask, once there is an answer', async () => {
    expect((await verdict(farm.asker.id, { settled: true })).status).toBe(409)
    await answer()
    await publish()
    expect((await verdict(undefined, { settled: true })).status).toBe(401)
    expect((await verdict(farm.viewer.id, { settled: true })).status).toBe(403)
    expect((await verdict(farm.owner.id, { settled: false })).status).toBe(403)
    expect((await verdict(farm.asker.id, {})).status).toBe(400)
    expect((await verdict(farm.asker.id, { settled: true })).status).toBe(200)
    expect(await (await look(question.id, farm.owner.id)).json()).toMatchObject({ settled: { yes: 1, no: 0 } })
    expect(await stateOf()).toBe('answered')
  })

  it('“not yet” opens the question again, and the next answer is a new letter', async () => {
    await answer()
    await publish()
    const reopened = await verdict(farm.asker.id, { settled: false, note: 'And on clay?' })
    expect(await reopened.json()).toMatchObject({ state: 'queued', followUp: null, answeredAt: null })
    expect((await verdict(farm.asker.id, { settled: false })).status).toBe(409)

    const next = await makeEpisode(farm.channel)
    await answer({ episodeId: next.id, start: 3, end: 5 })
    await publish(next.id)
    const letters = await lettersAbout()
    expect(letters).toHaveLength(2)
    expect(letters.filter(({ text }) => text.includes(`/episodes/${next.slug}?t=3`))).toHaveLength(1)
    expect(await Verdict.count({ where: { questionId: question.id } })).toBe(0)
  })

  it('belongs to people of joined questions as well, and not to those who stopped asking', async () => {
    const joined = await makeQuestion(farm.channel, farm.viewer)
    await move('join', joined.id, farm.owner.id, { into: question.id })
    await startAsking(question.id, farm.stranger.id)
    await answer()
    await publish()
    await stopAsking(question.id, farm.stranger.id)
    expect((await verdict(farm.stranger.id, { settled: false })).status).toBe(403)
    expect((await verdict(farm.viewer.id, { settled: true })).status).toBe(200)
  })
})
