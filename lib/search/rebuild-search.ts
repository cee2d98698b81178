import { QueryTypes } from 'sequelize'
import { db, inTransaction } from '@/lib/db'
import { documentsOfEpisodes, documentsOfExplainers, documentsOfQuestions, documentsOfTerms } from './document-reads'
import type { SearchDocument } from './document-rules'
import { lockIndex } from './index-lock'
import { indexIsThere, replaceIndex } from './search-index'

const AT_ONCE = 50

const sources = [
  ['episodes', documentsOfEpisodes],
  ['questions', documentsOfQuestions],
  ['terms', documentsOfTerms],
  ['explainers', documentsOfExplainers],
] as const

async function* everything(): AsyncGenerator<SearchDocument[]> {
  for (const [table, documentsOf] of sources) {
    const rows = await db().query<{ id: string }>(`select id from ${table} order by id`, { type: QueryTypes.SELECT })
    for (let from = 0; from < rows.length; from += AT_ONCE) {
      yield await documentsOf(rows.slice(from, from + AT_ONCE).map(({ id }) => id))
    }
  }
}

/** Makes the whole index anew from the database and puts it in place of the old one. Returns how many documents it holds. */
export const rebuildSearch = (): Promise<number> =>
  inTransaction(async (transaction) => {
    await lockIndex('alone', transaction)
    return replaceIndex(everything())
  })

/** Makes the index where there is none; of several that notice at once, one. */
export const buildMissingSearch = (): Promise<void> =>
  inTransaction(async (transaction) => {
    await lockIndex('alone', transaction)
    if (!(await indexIsThere())) await replaceIndex(everything())
  })
