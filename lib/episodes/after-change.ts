import type { Transaction } from 'sequelize'
import { hearTerms } from '@/lib/handbook/jobs'
import { enqueue } from '@/lib/jobs/queue'
import { refreshSearch } from '@/lib/search/jobs'

/** What follows from any change of an episode: terms are heard anew, and the index looks at it again. */
export async function afterEpisodeChange(id: string, transaction: Transaction): Promise<void> {
  await enqueue(hearTerms, { episodeId: id }, { transaction, key: id })
  await enqueue(refreshSearch, { kind: 'episode', id }, { transaction, key: `episode:${id}` })
}
