import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterAll, beforeAll } from 'vitest'
import { startSearchFake } from '@/fakes/search/start'
import { freePorts } from './free-ports'

const KEY = 'a key for tests'

/**
 * Gives the test file a search of its own that speaks the real protocol. Call it at the top of the file, before
 * anything searches. `stop` and `start` are for tests about a search that is down.
 */
export function freshSearch() {
  let where: { port: number; directory: string; key: string }
  let fake: Awaited<ReturnType<typeof startSearchFake>> | null = null
  const start = async () => void (fake = await startSearchFake(where))
  const stop = async () => {
    await fake?.stop()
    fake = null
  }
  beforeAll(async () => {
    const [port = 0] = await freePorts(1)
    where = { port, directory: await mkdtemp(join(tmpdir(), 'turnrow-search-')), key: KEY }
    Object.assign(process.env, { SEARCH_URL: `http://127.0.0.1:${port}`, SEARCH_KEY: KEY })
    await start()
  })
  afterAll(async () => {
    await stop()
    await rm(where.directory, { recursive: true, force: true })
  })
  return { start, stop }
}
