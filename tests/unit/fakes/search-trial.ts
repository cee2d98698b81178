import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Meilisearch } from 'meilisearch'
import { startSearchFake } from '@/fakes/search/start'
import { freePorts } from '../../support/free-ports'

/** A stand-in search of its own on a free port, the real client to it, and a way to stop and start it again. */
export async function searchTrial() {
  const directory = await mkdtemp(join(tmpdir(), 'search-'))
  const [port = 0] = await freePorts(1)
  const where = { port, directory, key: 'trial key' }
  let fake = await startSearchFake(where)
  const host = `http://127.0.0.1:${port}`
  return {
    host,
    directory,
    client: new Meilisearch({ host, apiKey: where.key, defaultWaitOptions: { timeout: 25_000 } }),
    async restart(meanwhile = async () => {}) {
      await fake.stop()
      await meanwhile()
      fake = await startSearchFake(where)
      // A kept-alive connection of before the restart fails once; the next request opens a new one.
      await fetch(`${host}/health`).catch(() => fetch(`${host}/health`))
    },
    async end() {
      await fake.stop()
      await rm(directory, { recursive: true, force: true })
    },
  }
}

export type Passage = { id: string; kind: string; title: string; text: string; stages: string[]; start?: number }

export const passages: Passage[] = [
  {
    id: 'passage-1',
    kind: 'passage',
    title: 'Throwing the hoop',
    text: 'Walk in well past the headland, toss the hoop over your shoulder. Nineteen plants in this one.',
    stages: ['wheat-21', 'wheat-2'],
    start: 160,
  },
  {
    id: 'passage-2',
    kind: 'passage',
    title: 'Why we count now',
    text: 'Three nights of hard frost on wheat that was barely tillering. Count before you worry.',
    stages: ['wheat-21', 'wheat-2'],
    start: 62,
  },
  {
    id: 'question-1',
    kind: 'question',
    title: 'Do dead tillers count if the crown is white?',
    text: 'The leaves are brown but the crown is white and firm.',
    stages: ['wheat-13', 'wheat-1'],
  },
  { id: 'term-1', kind: 'term', title: 'Crown', text: 'The short stem at the soil surface.', stages: [] },
]
