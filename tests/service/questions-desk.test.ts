import { beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { nobody } from '@/lib/auth/actor'
import { askedOn } from '@/lib/episodes/asked-and-answered'
import { Answer } from '@/models/answer'
import { Asking } from '@/models/asking'
import { Letter } from '@/models/letter'
import { Question } from '@/models/question'
import { QuestionEvent } from '@/models/question-event'
import { makeEpisode, makeFilm, makeQuestion } from '../factories'
import { freshDatabase } from '../support/database'
import { type Farm, look, makeFarm, type Move, move, startAsking } from '../support/questions'

freshDatabase()

let farm: Farm
let question: Question
beforeAll(async () => {
  farm = await makeFarm()
})
beforeEach(async () => {
  question = await makeQuestion(farm.channel, farm.asker)
})

const stateOf = async (id = question.id) => (await Question.findByPk(id, { rejectOnEmpty: true })).state
const lettersAbout = async () => (await Letter.findAll()).filter(({ text }) => text.includes(question.id))
const bodies = async (): Promise<Record<Exclude<Move, 'verdict'>, object>> => ({
  queue: {},
  join: { into: (await makeQuestion(farm.channel, farm.viewer)).id },
  'set-aside': { reason: 'Not about this farm.' },
  'ask-detail': { message: 'Which soil?' },
  'to-adviser': { note: 'Please look.' },
  book: { episodeId: farm.coming.id },
  answer: { episodeId: farm.coming.id, start: 3, end: 9, text: 'Do it early.' },
})

describe('the moves of the desk', () => {
  it('are refused to nobody, to viewers, to askers and to the desk of another channel', async () => {
    for (const [name, body] of Object.entries(await bodies()) as [Move, object][]) {
      const by = async (as?: string) => (await move(name, question.id, as, body)).status
      expect([name, await by()]).toEqual([name, 401])
      expect([name, await by(farm.viewer.id)]).toEqual([name, 403])
      expect([name, await by(farm.asker.id)]).toEqual([name, 403])
      expect([name, await by(farm.stranger.id)]).toEqual([name, 403])
    }
    expect(await stateOf()).toBe('new')
    expect(await QuestionEvent.count({ where: { questionId: question.id } })).toBe(0)
  })

  it('do not even tell another desk that a question set aside is there', async () => {
    await move('set-aside', question.id, farm.editor.id, { reason: 'Asked before.' })
    for (const [name, body] of Object.entries(await bodies()) as [Move, object][])
      expect([name, (await move(name, question.id, farm.stranger.id, body)).status]).toEqual([name, 404])
  })

  it('are done by owner and editor, and by the adviser as far as sorting goes', async () => {
    const made = () => makeQuestion(farm.channel, farm.asker)
    for (const [name, body] of Object.entries(await bodies()) as [Move, object][]) {
      for (const one of [farm.owner, farm.editor])
        expect([name, (await move(name, (await made()).id, one.id, body)).status]).toEqual([name, 200])
      const expected = name === 'book' || name === 'answer' ? 403 : 200
      expect([name, (await move(name, (await made()).id, farm.adviser.id, body)).status]).toEqual([name, expected])
    }
  })

  it('answer 409 where the state does not allow them, and change nothing', async () => {
    await question.update({ state: 'answered', answeredAt: new Date() })
    for (const [name, body] of Object.entries(await bodies()) as [Move, object][]) {
      if (name === 'answer') continue
      const refused = await move(name, question.id, farm.owner.id, body)
      expect([name, refused.status]).toEqual([name, 409])
      expect(await refused.json()).toMatchObject({ state: 'answered', title: 'Not possible now' })
    }
    expect(await lettersAbout()).toEqual([])
  })

  it('answer 400 without what they need and 404 for a question that is not there', async () => {
    for (const name of ['join', 'set-aside', 'ask-detail', 'book', 'answer'] as const)
      expect([name, (await move(name, question.id, farm.owner.id, {})).status]).toEqual([name, 400])
    expect((await move('queue', '5a1f5a5e-54f1-4c7c-9a53-0b4c2b1f6a11', farm.owner.id)).status).toBe(404)
  })

  it('leave who, when, what and why behind', async () => {
    await move('queue', question.id, farm.adviser.id)
    await move('set-aside', question.id, farm.owner.id, { reason: 'Answered in the handbook.' })
    const events = await QuestionEvent.findAll({ where: { questionId: question.id }, order: ['createdAt'] })
    expect(
      events.map(({ actorId, move: name, fromState, toState, detail }) => [actorId, name, fromState, toState, detail]),
    ).toEqual([
      [farm.adviser.id, 'queue', 'new', 'queued', null],
      [farm.owner.id, 'set-aside', 'queued', 'set-aside', 'Answered in the handbook.'],
    ])
  })

  it('show the desk what it may do next, and nobody else', async () => {
    expect(await (await look(question.id, farm.owner.id)).json()).toHaveProperty('moves')
    for (const as of [undefined, farm.asker.id, farm.stranger.id])
      expect(await (await look(question.id, as)).json()).not.toHaveProperty('moves')
  })
})

describe('two people at one question', () => {
  it('of two bookings at once one wins and the other is told', async () => {
    const later = await makeEpisode(farm.channel)
    const both = await Promise.all([
      move('book', question.id, farm.owner.id, { episodeId: farm.coming.id }),
      move('book', question.id, farm.editor.id, { episodeId: later.id }),
    ])
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409])
    expect(await QuestionEvent.count({ where: { questionId: question.id, move: 'book' } })).toBe(1)
  })

  it('of two joinings into each other one wins', async () => {
    const other = await makeQuestion(farm.channel, farm.viewer)
    const both = await Promise.all([
      move('join', question.id, farm.owner.id, { into: other.id }),
      move('join', other.id, farm.editor.id, { into: question.id }),
    ])
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409])
    expect(await Question.count({ where: { id: [question.id, other.id], state: 'joined' } })).toBe(1)
  })
})

describe('joining', () => {
  it('counts everybody of both questions once, and can be taken back', async () => {
    const into = await makeQuestion(farm.channel, farm.viewer)
    await startAsking(into.id, farm.stranger.id)
    await startAsking(question.id, farm.stranger.id)
    const joined = await move('join', question.id, farm.editor.id, { into: into.id })
    expect(await joined.json()).toMatchObject({ state: 'joined', joinedInto: { id: into.id } })
    expect(await (await look(into.id)).json()).toMatchObject({ asking: 3 })
    // The people of both are told apart and counted the same on the episode it was asked on.
    const episode = await makeEpisode(farm.channel, { state: 'published' })
    await into.update({ episodeId: episode.id, atMs: 0 })
    expect(await askedOn(episode.id, nobody)).toMatchObject([{ id: into.id, asking: 3 }])
    expect(await Asking.count({ where: { questionId: question.id } })).toBe(2)
    await move('queue', question.id, farm.editor.id)
    expect(await (await look(question.id)).json()).toMatchObject({ state: 'queued', joinedInto: null, asking: 2 })
    expect(await (await look(into.id)).json()).toMatchObject({ asking: 2 })
  })

  it('never goes more than one step deep', async () => {
    const [middle, last] = [
      await makeQuestion(farm.channel, farm.viewer),
      await makeQuestion(farm.channel, farm.viewer),
    ]
    await move('join', question.id, farm.editor.id, { into: middle.id })
    await move('join', middle.id, farm.editor.id, { into: last.id })
    expect((await Question.findByPk(question.id))?.joinedInto).toBe(last.id)
    const fresh = await makeQuestion(farm.channel, farm.viewer)
    expect((await move('join', fresh.id, farm.editor.id, { into: middle.id })).status).toBe(409)
  })

  it('takes no question of another channel and not itself', async () => {
    const foreign = await makeQuestion(farm.other, farm.viewer)
    expect((await move('join', question.id, farm.editor.id, { into: foreign.id })).status).toBe(422)
    expect((await move('join', question.id, farm.editor.id, { into: question.id })).status).toBe(422)
  })
})

describe('asking back and asking for advice', () => {
  it('writes one letter to the asker, and leaves the state', async () => {
    const response = await move('ask-detail', question.id, farm.editor.id, { message: 'Which <soil> is it?' })
    expect(await response.json()).toMatchObject({ state: 'new' })
    const [letter, ...more] = await lettersAbout()
    expect(more).toEqual([])
    expect(letter?.toAddress).toBe(farm.asker.email)
    expect(letter?.text).toContain('Which <soil> is it?')
    expect(letter?.html).toContain('Which &#60;soil&#62; is it?')
    expect(letter?.text).toContain(`http://localhost:3999/questions/${question.id}`)
  })

  it('is refused when the asker has left', async () => {
    await question.update({ askerId: null })
    expect((await move('ask-detail', question.id, farm.editor.id, { message: 'Which soil?' })).status).toBe(409)
    expect(await QuestionEvent.count({ where: { questionId: question.id } })).toBe(0)
  })

  it('writes to every adviser of the channel with the way to the desk', async () => {
    await move('to-adviser', question.id, farm.owner.id, { note: 'Is that still true?' })
    const about = await lettersAbout()
    expect(about.map(({ toAddress }) => toAddress)).toEqual([farm.adviser.email])
    expect(about[0]?.text).toContain(`/desk/${farm.channel.slug}/questions?question=${question.id}`)
    expect(about[0]?.text).toContain('Is that still true?')
  })
})

describe('booking and answering', () => {
  it('books for a coming episode of this channel alone', async () => {
    const [shown, foreign] = [await makeEpisode(farm.channel, { state: 'published' }), await makeEpisode(farm.other)]
    expect((await move('book', question.id, farm.owner.id, { episodeId: shown.id })).status).toBe(409)
    expect((await move('book', question.id, farm.owner.id, { episodeId: foreign.id })).status).toBe(422)
    const booked = await move('book', question.id, farm.owner.id, { episodeId: farm.coming.id })
    expect(await booked.json()).toMatchObject({ state: 'booked', bookedFor: { id: farm.coming.id } })
    const seen = (await (await look(question.id)).json()) as object
    expect(JSON.stringify(seen)).not.toContain(farm.coming.title)
  })

  it('stays booked with its answer until the episode is published, and shows the answer to the desk alone', async () => {
    const episode = await makeEpisode(farm.channel)
    await makeFilm(episode, 60_000)
    const range = { episodeId: episode.id, start: 12.5, end: 20, text: 'Roll them dry.' }
    expect((await move('answer', question.id, farm.editor.id, { ...range, end: 60.001 })).status).toBe(422)
    expect((await move('answer', question.id, farm.editor.id, { ...range, end: 12.5 })).status).toBe(422)
    const answered = await move('answer', question.id, farm.editor.id, range)
    expect(await answered.json()).toMatchObject({ state: 'booked', answer: range, followUp: null })
    await move('answer', question.id, farm.editor.id, { ...range, start: 13 })
    expect(await Answer.count({ where: { questionId: question.id } })).toBe(1)
    expect(JSON.stringify(await (await look(question.id)).json())).not.toContain('Roll them dry.')
    expect(await lettersAbout()).toEqual([])
  })

  it('takes the question back from the list to the queue', async () => {
    await move('book', question.id, farm.owner.id, { episodeId: farm.coming.id })
    expect(await (await move('queue', question.id, farm.owner.id)).json()).toMatchObject({
      state: 'queued',
      bookedFor: null,
    })
  })
})
