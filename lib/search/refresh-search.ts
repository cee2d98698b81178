import { QueryTypes } from 'sequelize'
import { db, inTransaction } from '@/lib/db'
import { documentsOfEpisodes, documentsOfExplainers, documentsOfQuestions, documentsOfTerms } from './document-reads'
import { lockIndex } from './index-lock'
import { rebuildSearch } from './rebuild-search'
import { indexIsThere, replaceDocuments } from './search-index'

type Source = { kind: 'episode' | 'question' | 'term' | 'explainer'; id: string }

const documentsOf = {
  episode: documentsOfEpisodes,
  question: documentsOfQuestions,
  term: documentsOfTerms,
  explainer: documentsOfExplainers,
}

/** What a question shows depends on the episodes it was asked on and answered by. */
const questionsAround = (episodeId: string): Promise<{ id: string }[]> =>
  db().query<{ id: string }>(
    `select id from questions where episode_id = $1
     union select question_id from answers where episode_id = $1`,
    { bind: [episodeId], type: QueryTypes.SELECT },
  )

async function refresh({ kind, id }: Source): Promise<void> {
  await replaceDocuments(`${kind}-${id}`, await documentsOf[kind]([id]))
  if (kind !== 'episode') return
  for (const question of await questionsAround(id)) await refresh({ kind: 'question', id: question.id })
}

/**
 * Makes the index say of one thing what the database says now: present, changed, gone or not public are all the same
 * to it. Running it twice changes nothing. Without an index it makes the whole one.
 * @throws Error when the search does not take it, so that the queue tries again
 */
export async function refreshSearchOf(source: Source): Promise<void> {
  if (!(await indexIsThere())) {
    await rebuildSearch()
    return
  }
  await inTransaction(async (transaction) => {
    await lockIndex('shared', transaction)
    await refresh(source)
  })
}
