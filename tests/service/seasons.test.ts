import { describe, expect, it } from 'vitest'
import * as seasons from '@/app/api/channels/[channel]/seasons/route'
import * as season from '@/app/api/channels/[channel]/seasons/[year]/route'
import { thisWeekInOtherYears, readBoard } from '@/lib/seasons/reads'
import { channelView } from '@/lib/channels/views'
import type { Channel } from '@/models/channel'
import { Season } from '@/models/season'
import { makeChannel, makeChapter, makeEpisode, makeMember, makeUser } from '../factories'
import { freshDatabase } from '../support/database'
import { call } from '../support/requests'

freshDatabase()

const wheat = {
  crop: 'wheat',
  field: 'Long Field',
  areaAcres: 64,
  plantedOn: '2025-10-06',
  windows: [
    { stage: '3', startsOn: '2026-03-29', endsOn: '2026-04-25' },
    { stage: '2', startsOn: '2026-01-01', endsOn: '2026-03-28' },
  ],
}

type Sent = { as?: string; body?: unknown; ifMatch?: string }

const on = (channel: Channel, year: number, method: 'GET' | 'PUT' | 'DELETE', { as, body, ifMatch }: Sent = {}) =>
  call(season[method], `/api/channels/${channel.slug}/seasons/${year}`, {
    method,
    as,
    body,
    headers: ifMatch ? { 'if-match': ifMatch } : {},
    params: { channel: channel.slug, year: String(year) },
  })

const begin = (channel: Channel, year: number, as?: string) =>
  call(seasons.POST, `/api/channels/${channel.slug}/seasons`, { as, body: { year }, params: { channel: channel.slug } })

async function farmWithSeason() {
  const channel = await makeChannel()
  const owner = await makeMember(channel, 'owner')
  await Season.create({ channelId: channel.id, year: 2026 })
  return { channel, owner }
}

describe('beginning a season', () => {
  it('is for owner and editor of that channel alone', async () => {
    const [channel, other] = [await makeChannel(), await makeChannel()]
    const people = {
      adviser: await makeMember(channel, 'adviser'),
      stranger: await makeMember(other, 'owner'),
      viewer: await makeUser(),
      editor: await makeMember(channel, 'editor'),
    }
    expect((await begin(channel, 2026)).status).toBe(401)
    expect((await begin(channel, 2026, people.stranger.id)).status).toBe(404)
    expect((await begin(channel, 2026, people.viewer.id)).status).toBe(404)
    expect((await begin(channel, 2026, people.adviser.id)).status).toBe(403)
    expect(await Season.count({ where: { channelId: channel.id } })).toBe(0)

    const made = await begin(channel, 2026, people.editor.id)
    expect(made.status).toBe(201)
    expect(made.headers.get('etag')).toBe('"1"')
    expect(await made.json()).toMatchObject({ year: 2026, plantings: [] })
  })

  it('is refused when the season is there, also when both ask at the same moment', async () => {
    const channel = await makeChannel()
    const owner = await makeMember(channel, 'owner')
    const answers = await Promise.all([begin(channel, 2026, owner.id), begin(channel, 2026, owner.id)])
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409])
    expect(await Season.count({ where: { channelId: channel.id } })).toBe(1)
  })
})

describe('saving a season', () => {
  it('replaces its lanes, gives the next edition, and everybody can read it', async () => {
    const { channel, owner } = await farmWithSeason()
    const saved = await on(channel, 2026, 'PUT', { as: owner.id, body: { plantings: [wheat] }, ifMatch: '"1"' })
    expect(saved.status).toBe(200)
    expect(saved.headers.get('etag')).toBe('"2"')

    const again = { ...wheat, field: 'Church Bottom' }
    await on(channel, 2026, 'PUT', { as: owner.id, body: { plantings: [again] }, ifMatch: '"2"' })
    const read = await on(channel, 2026, 'GET')
    expect(read.headers.get('etag')).toBe('"3"')
    const { plantings } = (await read.json()) as { plantings: { field: string; windows: { stage: string }[] }[] }
    expect(plantings.map(({ field }) => field)).toEqual(['Church Bottom'])
    expect(plantings[0]?.windows.map(({ stage }) => stage)).toEqual(['2', '3'])
  })

  it('is not possible for nobody, for viewers, for the owner of another farm, for an adviser', async () => {
    const { channel } = await farmWithSeason()
    const stranger = await makeMember(await makeChannel(), 'owner')
    const adviser = await makeMember(channel, 'adviser')
    const put = async (as?: string) =>
      (await on(channel, 2026, 'PUT', { as, body: { plantings: [] }, ifMatch: '"1"' })).status
    expect([await put(), await put((await makeUser()).id), await put(stranger.id), await put(adviser.id)]).toEqual([
      401, 404, 404, 403,
    ])
  })

  it('overwrites nobody: without If-Match 428, with an old one 412 and what stands now', async () => {
    const { channel, owner } = await farmWithSeason()
    const editor = await makeMember(channel, 'editor')
    expect((await on(channel, 2026, 'PUT', { as: owner.id, body: { plantings: [] } })).status).toBe(428)

    await on(channel, 2026, 'PUT', { as: editor.id, body: { plantings: [wheat] }, ifMatch: '"1"' })
    const late = await on(channel, 2026, 'PUT', { as: owner.id, body: { plantings: [] }, ifMatch: '"1"' })
    expect(late.status).toBe(412)
    expect(await late.json()).toMatchObject({ current: { edition: 2, plantings: [{ field: 'Long Field' }] } })
    const { plantings } = (await (await on(channel, 2026, 'GET')).json()) as { plantings: unknown[] }
    expect(plantings).toHaveLength(1)
  })

  it('lets one of two people through who save at the same moment', async () => {
    const { channel, owner } = await farmWithSeason()
    const put = (field: string) =>
      on(channel, 2026, 'PUT', { as: owner.id, body: { plantings: [{ ...wheat, field }] }, ifMatch: '"1"' })
    const answers = await Promise.all([put('One'), put('Two'), put('Three')])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412, 412])
  })

  it('says every broken rule with its place, and changes nothing', async () => {
    const { channel, owner } = await farmWithSeason()
    const windows = [
      { stage: '2', startsOn: '2026-01-01', endsOn: '2026-03-29' },
      { stage: '3', startsOn: '2026-03-29', endsOn: '2026-03-01' },
    ]
    const body = { plantings: [{ ...wheat, windows }] }
    const refused = await on(channel, 2026, 'PUT', { as: owner.id, body, ifMatch: '"1"' })
    expect(refused.status).toBe(422)
    const { errors } = (await refused.json()) as { errors: { path: string }[] }
    expect(errors.map(({ path }) => path)).toEqual(['plantings.0.windows.1.endsOn', 'plantings.0.windows.1.startsOn'])
    expect((await on(channel, 2026, 'GET')).headers.get('etag')).toBe('"1"')
  })

  it('refuses a day that does not exist as malformed', async () => {
    const { channel, owner } = await farmWithSeason()
    const body = { plantings: [{ ...wheat, plantedOn: '2026-02-29' }] }
    expect((await on(channel, 2026, 'PUT', { as: owner.id, body, ifMatch: '"1"' })).status).toBe(400)
  })
})

describe('taking a season off the board', () => {
  it('is refused while an episode is filed under it', async () => {
    const { channel, owner } = await farmWithSeason()
    const row = await Season.findOne({ where: { channelId: channel.id }, rejectOnEmpty: true })
    const episode = await makeEpisode(channel, { seasonId: row.id })
    const refused = await on(channel, 2026, 'DELETE', { as: owner.id, ifMatch: '"1"' })
    expect(refused.status).toBe(409)

    await episode.destroy()
    expect((await on(channel, 2026, 'DELETE', { as: owner.id, ifMatch: '"1"' })).status).toBe(204)
    expect((await on(channel, 2026, 'GET')).status).toBe(404)
  })

  it('is not found on another farm, whose season of that year stays', async () => {
    const { channel } = await farmWithSeason()
    const { channel: other, owner: stranger } = await farmWithSeason()
    expect((await on(channel, 2026, 'DELETE', { as: stranger.id, ifMatch: '"1"' })).status).toBe(404)
    expect(await Season.count({ where: { channelId: [channel.id, other.id] } })).toBe(2)
  })
})

describe('the board', () => {
  it('shows published episodes at their day of filming with the crop of their chapters, and no drafts', async () => {
    const { channel } = await farmWithSeason()
    const shown = await makeEpisode(channel, { state: 'published', filmedOn: '2026-03-18', number: 9 })
    await makeChapter(shown, 0, 'Why we count', ['wheat-21'])
    await makeEpisode(channel, { filmedOn: '2026-03-19' })
    await makeEpisode(channel, { state: 'withdrawn', filmedOn: '2026-03-20' })
    await makeEpisode(channel, { state: 'published', filmedOn: '2024-03-20' })

    const board = await readBoard(channel.slug, 2026)
    expect(board.episodes).toEqual([expect.objectContaining({ number: 9, crop: 'wheat', filmedOn: '2026-03-18' })])
    expect(board.episodes[0]?.url).toBe(`/channels/${channel.slug}/episodes/${shown.slug}`)
  })

  it('is there before the first season, and says not found for a year that has none', async () => {
    const channel = await makeChannel()
    expect(await readBoard(channel.slug, null)).toMatchObject({ season: null, years: [], episodes: [] })
    await expect(readBoard(channel.slug, 1999)).rejects.toMatchObject({ status: 404 })
    await expect(readBoard('no-such-farm', null)).rejects.toMatchObject({ status: 404 })
  })

  it('finds this week in other years over the year end, and never this year', async () => {
    const channel = await makeChannel()
    const film = (filmedOn: string, title: string) => makeEpisode(channel, { state: 'published', filmedOn, title })
    await film('2025-12-30', 'Last year')
    await film('2024-01-06', 'Two years ago')
    await film('2024-02-20', 'Too far off')
    await film('2026-01-03', 'This year')
    const found = await thisWeekInOtherYears(channelView(channel), '2026-01-02')
    expect(found.map(({ title }) => title)).toEqual(['Last year', 'Two years ago'])
  })
})
