import { beforeAll, describe, expect, it } from 'vitest'
import * as explainerRoute from '@/app/api/explainers/[slug]/route'
import * as explainersRoute from '@/app/api/explainers/route'
import * as termRoute from '@/app/api/terms/[slug]/route'
import * as termsRoute from '@/app/api/terms/route'
import * as topicsRoute from '@/app/api/topics/route'
import { explainerOutput, explainersOutput, termOutput, termsOutput } from '@/lib/handbook/schema'
import { loadHandbook } from '@/lib/handbook/load-handbook'
import { spokenTerms } from '@/lib/handbook/spoken-terms'
import { hearTermsInEpisode } from '@/lib/handbook/hear-terms'
import { topicsOutput } from '@/lib/topics/schema'
import { Hearing } from '@/models/hearing'
import { makeCaptions, makeChannel, makeChapter, makeEpisode, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { call } from '../support/requests'

freshDatabase()
beforeAll(() => loadHandbook())

type Heard = { items?: unknown; heard: { episode: { id: string }; at: number; text: string; url: string }[] }

const readTerm = async (slug: string, as?: string) => {
  const response = await call(termRoute.GET, `/api/terms/${slug}`, { as, params: { slug } })
  return { status: response.status, body: (await response.json()) as Heard }
}

const idsHeard = async (slug: string, as?: string) =>
  (await readTerm(slug, as)).body.heard.map(({ episode }) => episode.id)

/** An episode in whose second sentence the crown is named. */
async function spokenEpisode(state: 'draft' | 'published' = 'published') {
  const channel = await makeChannel()
  const episode = await makeEpisode(channel, { state })
  await makeChapter(episode, 0, 'Throwing the hoop', ['wheat-21'])
  await makeCaptions(episode, [
    [1000, 4000, 'Nineteen plants in this one.'],
    [4250, 7000, 'A plant is one crown, not one stem.'],
    [7000, 9000, 'Split the crown.'],
  ])
  await hearTermsInEpisode({ episodeId: episode.id })
  return { channel, episode }
}

describe('where a term is heard', () => {
  it('is told with the second, the sentence and an address that opens there, once per chapter', async () => {
    const { channel, episode } = await spokenEpisode()
    const { status, body } = await readTerm('crown')
    expect(status).toBe(200)
    expect(termOutput.parse(body)).toEqual(body)
    const here = body.heard.filter((one) => one.episode.id === episode.id)
    expect(here).toEqual([
      {
        episode: {
          id: episode.id,
          number: episode.number,
          title: episode.title,
          slug: episode.slug,
          channel: { slug: channel.slug, name: channel.name },
        },
        at: 4.25,
        text: 'A plant is one crown, not one stem.',
        url: `/channels/${channel.slug}/episodes/${episode.slug}?t=4.25`,
      },
    ])
  })

  it('leaves a draft out for everybody but its own desk', async () => {
    const { channel, episode } = await spokenEpisode('draft')
    const adviser = await makeMember(channel, 'adviser')
    const stranger = await makeMember(await makeChannel(), 'owner')
    const admin = await makeUser({ isAdmin: true })
    expect(await idsHeard('crown', adviser.id)).toContain(episode.id)
    for (const who of [undefined, (await makeUser()).id, stranger.id, admin.id]) {
      expect(await idsHeard('crown', who)).not.toContain(episode.id)
    }
  })

  it('is taken back when the episode is withdrawn', async () => {
    const { episode } = await spokenEpisode()
    await episode.update({ state: 'withdrawn' })
    expect(await idsHeard('crown')).not.toContain(episode.id)
  })

  it('is found anew when captions change, to the same end when it runs twice', async () => {
    const { episode } = await spokenEpisode()
    await hearTermsInEpisode({ episodeId: episode.id })
    expect(await Hearing.count({ where: { episodeId: episode.id } })).toBe(1)
    await makeChapter(episode, 6500, 'Splitting a crown')
    await hearTermsInEpisode({ episodeId: episode.id })
    expect(await Hearing.count({ where: { episodeId: episode.id } })).toBe(2)
  })

  it('survives two runs at once', async () => {
    const { episode } = await spokenEpisode()
    await Promise.all([1, 2, 3, 4].map(() => hearTermsInEpisode({ episodeId: episode.id })))
    expect(await Hearing.count({ where: { episodeId: episode.id } })).toBe(1)
  })

  it('is nothing for an episode that is gone, without captions or captioned in another language', async () => {
    await hearTermsInEpisode({ episodeId: '00000000-0000-4000-8000-000000000000' })
    const episode = await makeEpisode(await makeChannel(), { state: 'published' })
    await hearTermsInEpisode({ episodeId: episode.id })
    await makeCaptions(episode, [[0, 1000, 'La corona y el crown']], 'es')
    await hearTermsInEpisode({ episodeId: episode.id })
    expect(await Hearing.count({ where: { episodeId: episode.id } })).toBe(0)
  })

  it('is marked for the watch page with a note per term found', async () => {
    const cues = [{ start: 0, end: 2, text: 'Walk past the headland to a crown.' }]
    const { mentions, notes } = await spokenTerms(cues, [])
    expect(mentions).toEqual([
      [
        { from: 14, to: 22, slug: 'headland' },
        { from: 28, to: 33, slug: 'crown' },
      ],
    ])
    expect(notes.map(({ slug }) => slug).sort()).toEqual(['crown', 'headland'])
    expect(notes.find(({ slug }) => slug === 'crown')?.explainer).toMatchObject({
      slug: 'counting-a-stand',
      state: 'checked',
      sources: 4,
    })
  })
})

describe('GET /api/terms and /api/explainers', () => {
  it('list from A to Z for everybody, page by page without gaps', async () => {
    const whole = termsOutput.parse(await (await call(termsRoute.GET, '/api/terms')).json())
    expect(whole.items.length).toBeGreaterThanOrEqual(25)
    const slugs: string[] = []
    for (let cursor: string | null = ''; cursor !== null;) {
      const path: string = `/api/terms?limit=20${cursor && `&cursor=${cursor}`}`
      const page: typeof whole = termsOutput.parse(await (await call(termsRoute.GET, path)).json())
      slugs.push(...page.items.map(({ slug }) => slug))
      cursor = page.nextCursor
    }
    expect(slugs).toEqual(whole.items.map(({ slug }) => slug))
  })

  it('tell honestly how far each explainer was checked', async () => {
    const { items } = explainersOutput.parse(await (await call(explainersRoute.GET, '/api/explainers')).json())
    expect(Object.fromEntries(items.map(({ slug, state }) => [slug, state]))).toMatchObject({
      'ground-fit-to-work': 'in check',
      shrink: 'checked',
    })
  })

  it('give an explainer with its claims, sources and edition', async () => {
    const params = { slug: 'ground-fit-to-work' }
    const response = await call(explainerRoute.GET, '/api/explainers/ground-fit-to-work', { params })
    expect(response.headers.get('etag')).toBe('"1"')
    const { claims, bibliography } = explainerOutput.parse(await response.json())
    expect(claims.find(({ key }) => key === 'available-loam')).toMatchObject({
      low: 1.5,
      high: 2.1,
      unit: 'in/ft',
      verdict: 'agrees',
      source: { key: 'nrcs-feel-wy' },
      checkedOn: '2026-12-01',
    })
    expect(claims.find(({ key }) => key === 'thread-width')).toMatchObject({
      basis: 'from memory',
      verdict: null,
      checkedBy: null,
      checkedOn: null,
    })
    expect(bibliography.map(({ key }) => key)).toContain('dexter-bird-2001')
  })

  it('know nothing of what is not there, and take no odd limit or cursor', async () => {
    expect((await readTerm('no-such-term')).status).toBe(404)
    const params = { slug: 'nothing' }
    expect((await call(explainerRoute.GET, '/api/explainers/nothing', { params })).status).toBe(404)
    for (const query of ['limit=0', 'limit=101', 'limit=many', 'cursor=abc']) {
      expect((await call(termsRoute.GET, `/api/terms?${query}`)).status).toBe(400)
      expect((await call(explainersRoute.GET, `/api/explainers?${query}`)).status).toBe(400)
    }
  })
})

describe('GET /api/topics', () => {
  const read = async (query = '') => {
    const response = await call(topicsRoute.GET, `/api/topics${query}`)
    return topicsOutput.parse(await response.json())
  }

  it('answers whole for everybody', async () => {
    const { items, nextCursor } = await read()
    expect(nextCursor).toBeNull()
    const codes = items.map(({ code }) => code)
    expect(codes).toEqual(expect.arrayContaining(['soil', 'wheat-21', 'job-spraying', 'subject-water']))
    expect(codes).not.toContain('rice-31')
  })

  it('narrows to a crop and a kind, and pages when asked', async () => {
    const { items } = await read('?crop=rice&kind=stage')
    expect(items.every(({ crop, kind }) => crop === 'rice' && kind === 'stage')).toBe(true)
    const first = await read('?crop=rice&limit=3')
    const second = await read(`?crop=rice&limit=3&cursor=${first.nextCursor}`)
    expect([...first.items, ...second.items]).toEqual(items.slice(0, 6))
  })

  it('refuses a crop or kind that it does not have', async () => {
    for (const query of ['?crop=barley', '?kind=tool', '?limit=0']) {
      expect((await call(topicsRoute.GET, `/api/topics${query}`)).status).toBe(400)
    }
  })
})
