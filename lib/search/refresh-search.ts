import { QueryTypes, type Transaction } from 'sequelize'
import { db, inTransaction } from '@/lib/db'
import { documentsOfEpisodes, documentsOfExplainers, documentsOfQuestions, documentsOfTerms } from './document-reads'
import { lockIndex, lockSource } from './index-lock'
import { buildMissingSearch } from './rebuild-search'
import { indexIsThere, replaceDocuments } from './search-index'

type Source = { kind: 'episode' | 'question' | 'term' | 'explainer'; id: string }

const documentsOf = {
  episode: documentsOfEpisodes,
  question: documentsOfQuestions,
  term: documentsOfTerms,
  explainer: documentsOfExplainers,
}

/** What a question shows depends on the episodes it was asked on and answered by. In one order for all, for the locks. */
const questionsAround = (episodeId: string): Promise<{ id: string }[]> =>
  db().query<{ id: string }>(
    `select id from questions where episode_id = $1
     union select question_id from answers where episode_id = $1 order by id`,
    { bind: [episodeId], type: QueryTypes.SELECT },
  )

async function refresh({ kind, id }: Source, transaction: Transaction): Promise<void> {
  const source = `${kind}-${id}`
  await lockSource(source, transaction)
  await replaceDocuments(source, await documentsOf[kind]([id]))
  if (kind !== 'episode') return
  for (const question of await questionsAround(id)) await refresh({ kind: 'question', id: question.id }, transaction)
}

/**
 * Makes the index say of one thing what the database says now: present, changed, gone or not public are all the same
 * to it. Running it twice changes nothing. Without an index it makes the whole one.
 * @throws Error when the search does not take it, so that the queue tries again
 */
export async function refreshSearchOf(source: Source): Promise<void> {
  if (!(await indexIsThere())) {
    await buildMissingSearch()
    return
  }
  await inTransaction(async (transaction) => {
    await lockIndex('shared', transaction)
    await refresh(source, transaction)
  })
}
