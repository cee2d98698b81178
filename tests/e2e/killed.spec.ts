import { createHash, randomUUID } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { expect, type APIRequestContext, test } from '@playwright/test'
import { demoPassword } from '@/lib/demo/story/people'
import type { EpisodeView } from '@/lib/episodes/views'
import type { FootageView } from '@/lib/footage/views'
import { type Clip, removeClip, stubbleClip } from './support/clips'

/** The web and the worker are killed without warning in the middle of the work; whoever started them starts them again. */
test.describe.configure({ mode: 'serial', timeout: 15 * 60_000 })

const tus = { 'tus-resumable': '1.0.0' }
const encoded = (value: string) => Buffer.from(value).toString('base64')

let clip: Clip
let film: Buffer

test.beforeAll(async () => {
  clip = await stubbleClip()
  film = readFileSync(clip.path)
})
test.afterAll(() => removeClip(clip))

type Server = 'web' | 'worker'
const pidOf = (server: Server): number => JSON.parse(readFileSync(process.env.E2E_PIDS_FILE ?? '', 'utf8'))[server]

/** Kills a server and waits until another process has taken its place. */
async function kill(server: Server, request: APIRequestContext): Promise<void> {
  const pid = pidOf(server)
  process.kill(pid, 'SIGKILL')
  await expect.poll(() => pidOf(server), { timeout: 120_000 }).not.toBe(pid)
  await expect.poll(() => isUp(request), { timeout: 120_000 }).toBe(true)
}

const isUp = (request: APIRequestContext) =>
  request
    .get('/api/health', { timeout: 5_000 })
    .then((answer) => answer.ok())
    .catch(() => false)

async function signIn(request: APIRequestContext): Promise<void> {
  const { csrfToken } = await (await request.get('/api/auth/csrf')).json()
  const form = { csrfToken, email: 'nell@alderfork.example', password: demoPassword, json: 'true' }
  expect((await request.post('/api/auth/callback/password', { form })).ok()).toBe(true)
}

const make = (request: APIRequestContext, title: string, key: string) =>
  request.post('/api/channels/alder-fork/episodes', { data: { title }, headers: { 'idempotency-key': key } })

const footageOf = async (request: APIRequestContext, id: string): Promise<FootageView> =>
  (await request.get(`/api/episodes/${id}/footage`)).json()

test('an episode asked for again after the web was killed is the same one', async ({ request }) => {
  await signIn(request)
  const key = randomUUID()
  const title = `Asked twice ${key.slice(0, 8)}`
  const first = (await (await make(request, title, key)).json()) as EpisodeView
  // Asked for at the moment of death: whatever became of this one, it must not become a second.
  const lost = make(request, title, key).catch(() => null)
  await kill('web', request)
  await lost
  const again = (await (await make(request, title, key)).json()) as EpisodeView
  expect(again.id).toBe(first.id)
  const list = await (await request.get('/api/channels/alder-fork/episodes?limit=100&state=draft')).json()
  expect((list.items as EpisodeView[]).filter((episode) => episode.title === title)).toHaveLength(1)
})

test('a film survives the death of the web in its upload and of the worker in its making', async ({ request }) => {
  await signIn(request)
  const episode = (await (
    await make(request, `Killed ${randomUUID().slice(0, 8)}`, randomUUID())
  ).json()) as EpisodeView
  const metadata = `episodeId ${encoded(episode.id)},filename ${encoded('film.mp4')},filetype ${encoded('video/mp4')}`
  const begun = await request.post('/api/footage', {
    headers: { ...tus, 'upload-length': String(film.length), 'upload-metadata': metadata },
  })
  expect(begun.status()).toBe(201)
  const upload = begun.headers().location ?? ''
  const send = (offset: number, until: number) =>
    request.patch(upload, {
      data: film.subarray(offset, until),
      headers: {
        ...tus,
        'upload-offset': String(offset),
        'content-type': 'application/offset+octet-stream',
        'upload-checksum': `sha1 ${createHash('sha1').update(film.subarray(offset, until)).digest('base64')}`,
      },
    })
  const half = Math.floor(film.length / 2)
  expect((await send(0, half)).status()).toBe(204)
  const lost = send(half, film.length).catch(() => null)
  await kill('web', request)
  await lost

  // What was acknowledged is there; the rest goes on from where the server says it stands.
  const offset = Number((await request.head(upload, { headers: tus })).headers()['upload-offset'])
  expect(offset).toBeGreaterThanOrEqual(half)
  if (offset < film.length) expect((await send(offset, film.length)).status()).toBe(204)

  const state = async () => (await footageOf(request, episode.id)).state
  await expect.poll(state, { timeout: 600_000, intervals: [300] }).toMatch(/encoding|ready/)
  await kill('worker', request)
  await expect.poll(state, { timeout: 600_000, intervals: [1_000] }).toBe('ready')
  const { film: shown, duration } = (await (await request.get(`/api/episodes/${episode.id}`)).json()) as EpisodeView
  expect(shown?.sizes.length).toBeGreaterThanOrEqual(2)
  expect(new Set(shown?.sizes.map(({ height }) => height)).size).toBe(shown?.sizes.length)
  expect(Math.abs((duration ?? 0) - clip.sheet.durationMs / 1000)).toBeLessThan(0.2)
  expect((await request.get(shown?.hls ?? '')).ok()).toBe(true)
})
