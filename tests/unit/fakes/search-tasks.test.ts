import { writeFile } from 'node:fs/promises'
import { join } from 'node:path'
import { Meilisearch } from 'meilisearch'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { passages, searchTrial } from './search-trial'

// Real servers and a real disk: a busy machine is not a failure.
vi.setConfig({ testTimeout: 30_000, hookTimeout: 30_000 })

let trial: Awaited<ReturnType<typeof searchTrial>>
beforeEach(async () => void (trial = await searchTrial()))
afterEach(() => trial.end())

const index = () => trial.client.index('passages')
const found = async (uid = 'passages', q = '') =>
  (await trial.client.index(uid).search(q)).hits.map(({ id }) => String(id))
const fill = () => index().addDocuments(passages, { primaryKey: 'id' }).waitTask()

test('a write is accepted with 202 and a task, and done when the task says so', async () => {
  const accepted = await index().addDocuments(passages, { primaryKey: 'id' })
  expect(accepted).toMatchObject({ status: 'enqueued', indexUid: 'passages', type: 'documentAdditionOrUpdate' })
  const task = await trial.client.tasks.waitForTask(accepted)
  expect(task).toMatchObject({
    status: 'succeeded',
    error: null,
    details: { receivedDocuments: 4, indexedDocuments: 4 },
  })
  expect(await found()).toHaveLength(4)
})

test('a task that fails says why, and takes none of its documents', async () => {
  const good = { id: 'passage-9', title: 'Good' }
  const bad = await index()
    .addDocuments([good, { id: 'not an id!', title: 'Bad' }], { primaryKey: 'id' })
    .waitTask()
  expect(bad).toMatchObject({ status: 'failed', error: { code: 'invalid_document_id', type: 'invalid_request' } })
  const none = await index()
    .addDocuments([{ title: 'No id' }], { primaryKey: 'id' })
    .waitTask()
  expect(none).toMatchObject({ status: 'failed', error: { code: 'missing_document_id' } })
  expect(await found().catch(() => [])).toEqual([])
  const missing = await trial.client.index('nowhere').deleteDocument('x').waitTask()
  expect(missing).toMatchObject({ status: 'failed', error: { code: 'index_not_found' } })
  const { results } = await trial.client.tasks.getTasks({ statuses: ['failed'] })
  expect(results.map(({ uid }) => uid)).toEqual([2, 1, 0])
})

test('documents are replaced whole or joined field by field, and vanish when deleted', async () => {
  await fill()
  await index()
    .updateDocuments([{ id: 'term-1', text: 'Joined' }])
    .waitTask()
  expect(await index().getDocument('term-1')).toMatchObject({ title: 'Crown', text: 'Joined' })
  await index()
    .addDocuments([{ id: 'term-1', text: 'Replaced' }])
    .waitTask()
  expect(await index().getDocument('term-1')).toEqual({ id: 'term-1', text: 'Replaced' })
  expect(await found('passages', 'Crown')).toEqual(['question-1'])

  await index().deleteDocument('term-1').waitTask()
  await expect(index().getDocument('term-1')).rejects.toMatchObject({ cause: { code: 'document_not_found' } })
  await index().deleteDocuments(['passage-1', 'was-never-there']).waitTask()
  expect(await found()).toEqual(['passage-2', 'question-1'])
  await index().updateFilterableAttributes(['kind']).waitTask()
  await index().deleteDocuments({ filter: 'kind = question' }).waitTask()
  expect(await found()).toEqual(['passage-2'])
  await index().deleteAllDocuments().waitTask()
  expect(await found()).toEqual([])
})

test('after any order of writes a search finds what a freshly read index finds', async () => {
  const texts = ['frost on wheat', 'wheat at harvest', 'frost and harvest', 'hoop']
  await index()
    .addDocuments([{ id: 0, text: 'frost' }])
    .waitTask()
  await found('passages', 'frost')
  for (let step = 0; step < 24; step++) {
    const id = (step * 7) % 5
    if (step % 4 === 3) await index().deleteDocument(id).waitTask()
    else if (step % 4 === 2)
      await index()
        .updateDocuments([{ id, note: texts[step % 3] }])
        .waitTask()
    else
      await index()
        .addDocuments([{ id, text: texts[step % texts.length] }])
        .waitTask()
  }
  const answers = () => Promise.all(['frost', 'wheat', 'harvest', 'hoop', ''].map((q) => found('passages', q)))
  const before = await answers()
  await trial.restart()
  expect((await answers()).map((ids) => ids.sort())).toEqual(before.map((ids) => ids.sort()))
  expect(before.flat().length).toBeGreaterThan(4)
})

test('a fresh index takes the place of the old one in one step', async () => {
  await fill()
  await trial.client.createIndex('passages-new', { primaryKey: 'id' }).waitTask()
  await trial.client
    .index('passages-new')
    .addDocuments([{ id: 'fresh' }])
    .waitTask()
  await trial.client.swapIndexes([{ indexes: ['passages', 'passages-new'], rename: false }]).waitTask()
  expect(await found()).toEqual(['fresh'])
  expect(await found('passages-new')).toHaveLength(4)
  await trial.client.deleteIndex('passages-new').waitTask()
  await expect(found('passages-new')).rejects.toMatchObject({ cause: { code: 'index_not_found' } })
  const swap = await trial.client.swapIndexes([{ indexes: ['passages', 'nowhere'], rename: false }]).waitTask()
  expect(swap).toMatchObject({ status: 'failed', error: { code: 'index_not_found' } })
  await trial.restart()
  expect(await found()).toEqual(['fresh'])
})

test('an index that exists is not made twice', async () => {
  await trial.client.createIndex('passages', { primaryKey: 'id' }).waitTask()
  const again = await trial.client.createIndex('passages', { primaryKey: 'id' }).waitTask()
  expect(again).toMatchObject({ status: 'failed', error: { code: 'index_already_exists' } })
  expect((await trial.client.getRawIndexes()).results).toMatchObject([{ uid: 'passages', primaryKey: 'id' }])
})

test('documents, settings and the outcome of tasks are there after a restart', async () => {
  await fill()
  await index()
    .updateSettings({ stopWords: ['the'], rankingRules: ['words', 'typo'] })
    .waitTask()
  const before = await index().getSettings()
  await trial.restart()
  expect(await found('passages', 'hoop')).toEqual(['passage-1'])
  expect(await index().getSettings()).toEqual(before)
  expect((await trial.client.tasks.getTasks()).results.map(({ status }) => status)).toEqual(['succeeded', 'succeeded'])
})

test('a task that was accepted and not done before a kill is done at the next start', async () => {
  // What a kill between the 202 and the work leaves on the disk.
  const catalogue = {
    nextTask: 8,
    tasks: [
      { uid: 7, indexUid: 'late', status: 'enqueued', type: 'documentAdditionOrUpdate', details: {}, error: null },
    ],
    waiting: [
      {
        uid: 7,
        work: {
          type: 'documentAdditionOrUpdate',
          indexUid: 'late',
          documents: [{ id: 1 }],
          merge: false,
          primaryKey: null,
        },
      },
    ],
    indexes: [],
  }
  await trial.restart(() => writeFile(join(trial.directory, 'catalogue.json'), JSON.stringify(catalogue)))
  expect(await trial.client.tasks.waitForTask(7)).toMatchObject({ status: 'succeeded' })
  expect(await found('late')).toEqual(['1'])
})

test('settings are checked by name and value, and null puts the default back', async () => {
  await index()
    .updateSettings({ stopWords: ['the'] })
    .waitTask()
  await index().updateSettings({ stopWords: null }).waitTask()
  expect(await index().getStopWords()).toEqual([])
  await index()
    .updateSynonyms({ corn: ['maize'] })
    .waitTask()
  expect(await index().getSynonyms()).toEqual({ corn: ['maize'] })
  await index().resetSynonyms().waitTask()
  expect((await index().getSettings()).synonyms).toEqual({})
  await expect(index().updateSettings({ rankingRules: ['best'] })).rejects.toMatchObject({
    cause: { code: 'invalid_settings_ranking_rules' },
  })
})

test('every call but health needs the key', async () => {
  const without = new Meilisearch({ host: trial.host })
  const wrong = new Meilisearch({ host: trial.host, apiKey: 'another' })
  expect(await without.health()).toEqual({ status: 'available' })
  await expect(without.getVersion()).rejects.toMatchObject({ cause: { code: 'missing_authorization_header' } })
  await expect(wrong.getVersion()).rejects.toMatchObject({ cause: { code: 'invalid_api_key' } })
  await expect(wrong.index('passages').search('x')).rejects.toMatchObject({ response: { status: 403 } })
})

test('what is not spoken or not readable is refused in the documented shape', async () => {
  const ask = (path: string, init: RequestInit = {}) =>
    fetch(`${trial.host}${path}`, { ...init, headers: { Authorization: 'Bearer trial key' } })
  expect((await ask('/dumps', { method: 'POST' })).status).toBe(404)
  const broken = await ask('/indexes/passages/documents', { method: 'POST', body: '{"id": 1' })
  expect(broken.status).toBe(400)
  expect(await broken.json()).toMatchObject({ code: 'malformed_payload', type: 'invalid_request' })
  const list = await ask('/indexes/passages/search', { method: 'POST', body: '{"q": ["a"]}' })
  expect(await list.json()).toMatchObject({ code: 'index_not_found' })
  await fill()
  const typed = await ask('/indexes/passages/search', { method: 'POST', body: '{"q": ["a"]}' })
  expect(await typed.json()).toMatchObject({ code: 'invalid_search_q' })
})

test('counts per index and per field are told', async () => {
  await fill()
  expect(await index().getStats()).toMatchObject({ numberOfDocuments: 4, fieldDistribution: { id: 4, start: 2 } })
  expect((await trial.client.getStats()).indexes).toHaveProperty('passages')
})
