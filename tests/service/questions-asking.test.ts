import { beforeAll, describe, expect, it } from 'vitest'
import { GET as listRoute, POST as askRoute } from '@/app/api/questions/route'
import { GET as similarRoute } from '@/app/api/questions/similar/route'
import { questionOutput, questionPage } from '@/lib/questions/schema'
import { Asking } from '@/models/asking'
import { Question } from '@/models/question'
import { makeChannel, makeChapter, makeEpisode, makeFilm, makeQuestion, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { waitingJobs } from '../support/jobs'
import { type Farm, look, makeFarm, startAsking, stopAsking } from '../support/questions'
import { call } from '../support/requests'

freshDatabase()

let farm: Farm
beforeAll(async () => {
  farm = await makeFarm()
})

const ask = (as: string | undefined, body: object, headers: Record<string, string> = {}) =>
  call(askRoute, '/api/questions', { as, body: { channel: farm.channel.slug, title: 'How late?', ...body }, headers })
const list = async (query: string, as?: string) => {
  const response = await call(listRoute, `/api/questions?${query}`, { as })
  return { status: response.status, page: questionPage.parse(await response.json()) }
}

describe('asking a question', () => {
  it('needs somebody who is signed in', async () => {
    expect((await ask(undefined, {})).status).toBe(401)
  })

  it('answers 201 with the question as it stands, its asker the first who is asking', async () => {
    const response = await ask(farm.asker.id, { body: 'After the first node.', crop: 'wheat', stage: 'wheat-31' })
    expect(response.status).toBe(201)
    expect(response.headers.get('etag')).toBe('"1"')
    const question = questionOutput.parse(await response.json())
    expect(question).toMatchObject({ state: 'new', asking: 1, youAreAsking: true, askedBy: farm.asker.name })
    expect(question).toMatchObject({ crop: 'wheat', stage: 'wheat-31', at: null, followUp: null })
    expect(JSON.stringify(question)).not.toContain(farm.asker.email)
    const jobs = await waitingJobs('search.refresh')
    expect(jobs.map(({ data }) => data)).toContainEqual({ kind: 'question', id: question.id })
  })

  it('fills in crop and stage from the chapter at the second that was watched', async () => {
    const episode = await makeEpisode(farm.channel, { state: 'published' })
    await makeFilm(episode, 60_000)
    await makeChapter(episode, 0, 'Seedbed', ['soil'])
    await makeChapter(episode, 20_000, 'First node', ['wheat-31', 'job-fertilising'])
    const late = questionOutput.parse(await (await ask(farm.asker.id, { episodeId: episode.id, at: 31.25 })).json())
    expect(late).toMatchObject({ crop: 'wheat', stage: 'wheat-31', at: 31.25 })
    expect(late.episode?.url).toBe(`/channels/${farm.channel.slug}/episodes/${episode.slug}?t=31.25`)
    const early = questionOutput.parse(await (await ask(farm.asker.id, { episodeId: episode.id, at: 19.999 })).json())
    expect(early).toMatchObject({ crop: null, stage: 'soil' })
    const own = questionOutput.parse(
      await (await ask(farm.asker.id, { episodeId: episode.id, at: 31, crop: 'maize' })).json(),
    )
    expect(own).toMatchObject({ crop: 'maize', stage: null })
    expect((await ask(farm.asker.id, { episodeId: episode.id, at: 61 })).status).toBe(422)
  })

  it('refuses what is malformed with 400 and what breaks a rule with 422', async () => {
    expect((await ask(farm.asker.id, { title: ' ' })).status).toBe(400)
    expect((await ask(farm.asker.id, { title: 'x'.repeat(161) })).status).toBe(400)
    expect((await ask(farm.asker.id, { stage: 'maize-22' })).status).toBe(400)
    expect((await ask(farm.asker.id, { at: 3 })).status).toBe(422)
    expect((await ask(farm.asker.id, { crop: 'rice', stage: 'wheat-31' })).status).toBe(422)
    expect((await ask(farm.asker.id, { channel: 'no-such-farm' })).status).toBe(404)
  })

  it('knows no draft of another channel, and takes no episode of another channel', async () => {
    const draft = await makeEpisode(farm.other)
    expect((await ask(farm.asker.id, { episodeId: draft.id })).status).toBe(404)
    const shown = await makeEpisode(farm.other, { state: 'published' })
    expect((await ask(farm.asker.id, { episodeId: shown.id })).status).toBe(422)
  })

  it('makes one question of 20 identical requests that carry one Idempotency-Key', async () => {
    const body = { title: 'Sent twenty times' }
    const sent = Array.from({ length: 20 }, () => ask(farm.viewer.id, body, { 'idempotency-key': 'from-the-field-1' }))
    const responses = await Promise.all(sent)
    expect(responses.map(({ status }) => status)).toEqual(Array.from({ length: 20 }, () => 201))
    const ids = await Promise.all(responses.map(async (response) => ((await response.json()) as { id: string }).id))
    expect(new Set(ids).size).toBe(1)
    expect(await Question.count({ where: body })).toBe(1)
    expect((await ask(farm.viewer.id, { title: 'Another' }, { 'idempotency-key': 'from-the-field-1' })).status).toBe(
      422,
    )
  })

  it('stops somebody who asks without end', async () => {
    const restless = await makeUser()
    const titles = Array.from({ length: 60 }, (_, index) => `Again ${index}`)
    await Question.bulkCreate(titles.map((title) => ({ channelId: farm.channel.id, askerId: restless.id, title })))
    const refused = await ask(restless.id, {})
    expect([refused.status, refused.headers.get('retry-after')]).toEqual([429, '3600'])
  })
})

describe('asking too', () => {
  it('counts everybody once, however often and at once they say it', async () => {
    const question = await makeQuestion(farm.channel, farm.asker)
    const people = await Promise.all([makeUser(), makeUser(), makeUser()])
    const said = people.flatMap(({ id }) => Array.from({ length: 7 }, () => startAsking(question.id, id)))
    expect((await Promise.all(said)).every(({ status }) => status === 200)).toBe(true)
    expect(await Asking.count({ where: { questionId: question.id } })).toBe(4)
    const [first] = people
    const answer = await startAsking(question.id, first?.id)
    expect(await answer.json()).toEqual({ asking: 4, youAreAsking: true })
    expect(await (await stopAsking(question.id, first?.id)).json()).toEqual({ asking: 3, youAreAsking: false })
    expect(await (await stopAsking(question.id, first?.id)).json()).toEqual({ asking: 3, youAreAsking: false })
  })

  it('needs a person, and a question that this person may see', async () => {
    const hidden = await makeQuestion(farm.channel, farm.asker, { state: 'set-aside', setAsideReason: 'off topic' })
    expect((await startAsking(hidden.id)).status).toBe(401)
    expect((await startAsking(hidden.id, farm.viewer.id)).status).toBe(404)
    expect((await startAsking('5a1f5a5e-54f1-4c7c-9a53-0b4c2b1f6a11', farm.viewer.id)).status).toBe(404)
  })
})

describe('questions as others see them', () => {
  it('shows what is set aside to the asker and the desk alone, with the reason', async () => {
    const hidden = await makeQuestion(farm.channel, farm.asker, { state: 'set-aside', setAsideReason: 'asked before' })
    for (const as of [undefined, farm.viewer.id, farm.stranger.id]) {
      expect((await look(hidden.id, as)).status).toBe(404)
      const { page } = await list(`channel=${farm.channel.slug}&limit=100`, as)
      expect(page.items.map(({ id }) => id)).not.toContain(hidden.id)
    }
    for (const as of [farm.asker.id, farm.adviser.id]) {
      expect(await (await look(hidden.id, as)).json()).toMatchObject({ setAsideReason: 'asked before' })
      const { page } = await list(`state=set-aside&limit=100`, as)
      expect(page.items.map(({ id }) => id)).toContain(hidden.id)
    }
  })

  it('tells the way to a follow-up and to where it was asked only while those episodes can be watched', async () => {
    const [asked, answering] = [
      await makeEpisode(farm.channel, { state: 'withdrawn' }),
      await makeEpisode(farm.channel, { state: 'withdrawn' }),
    ]
    const question = await makeQuestion(farm.channel, farm.asker, {
      state: 'answered',
      answeredAt: new Date(),
      episodeId: asked.id,
      atMs: 4000,
    })
    const { Answer } = await import('@/models/answer')
    const range = { startMs: 125_500, endMs: 140_000, text: 'Count the plant.' }
    await Answer.create({ questionId: question.id, episodeId: answering.id, ...range })
    const seen = async (as?: string) => questionOutput.parse(await (await look(question.id, as)).json())
    expect(await seen(farm.viewer.id)).toMatchObject({ state: 'answered', episode: null, followUp: null })
    expect((await seen(farm.editor.id)).followUp).not.toBeNull()
    await answering.update({ state: 'published', publishedAt: new Date() })
    expect((await seen()).followUp).toMatchObject({
      number: answering.number,
      url: `/channels/${farm.channel.slug}/episodes/${answering.slug}?t=125.5`,
      start: 125.5,
      end: 140,
      text: 'Count the plant.',
    })
  })

  it('pages through every order without skipping or repeating', async () => {
    const channel = await makeChannel()
    const made = await Promise.all(Array.from({ length: 11 }, () => makeQuestion(channel, farm.asker)))
    await startAsking(made[3]?.id ?? '', farm.viewer.id)
    for (const sort of ['newest', 'asking', 'urgency']) {
      const seen: string[] = []
      for (let cursor: string | null = ''; cursor !== null;) {
        const query = `channel=${channel.slug}&sort=${sort}&limit=4${cursor && `&cursor=${cursor}`}`
        const { page }: Awaited<ReturnType<typeof list>> = await list(query)
        seen.push(...page.items.map(({ id }) => id))
        cursor = page.nextCursor
      }
      expect([sort, seen.length, new Set(seen).size]).toEqual([sort, 11, 11])
      if (sort !== 'newest') expect(seen[0]).toBe(made[3]?.id)
    }
    expect((await call(listRoute, '/api/questions?cursor=abc', {})).status).toBe(400)
    expect((await call(listRoute, '/api/questions?state=open', {})).status).toBe(400)
    expect((await call(listRoute, '/api/questions?channel=nowhere', {})).status).toBe(404)
  })
})

describe('looking for the same question', () => {
  it('finds it in other words, with a score, and says nothing about unrelated ones', async () => {
    const channel = await makeChannel()
    const beans = await makeQuestion(channel, farm.asker, { title: 'Does rolling beans early cost pods?' })
    const late = await makeQuestion(channel, farm.asker, { title: 'Is it too late to roll soybeans?' })
    await makeQuestion(channel, farm.asker, { title: 'Which oil goes into the gearbox?' })
    const hidden = { state: 'set-aside', setAsideReason: 'rude' } as const
    await makeQuestion(channel, farm.asker, { title: 'Do rolled beans lose pods?', ...hidden })
    const q = encodeURIComponent('When is it too late to roll my beans?')
    const response = await call(similarRoute, `/api/questions/similar?channel=${channel.slug}&q=${q}`)
    const { items } = (await response.json()) as { items: { id: string; score: number; kind: string }[] }
    expect(items.map(({ id }) => id)).toEqual([late.id, beans.id])
    for (const { score } of items) expect(score).toBeGreaterThan(0)
    for (const { score } of items) expect(score).toBeLessThanOrEqual(1)
  })

  it('takes any text, also one of signs alone', async () => {
    for (const q of ["'", '% | & ! :*', "a' | 'b", '\\', 'the of and'])
      expect((await call(similarRoute, `/api/questions/similar?q=${encodeURIComponent(q)}`)).status).toBe(200)
  })
})
