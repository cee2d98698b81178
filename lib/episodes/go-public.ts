import type { Transaction } from 'sequelize'
import { now } from '@/lib/clock'
import { answerOnPublication } from '@/lib/questions/publication'
import type { Episode } from '@/models/episode'
import { afterEpisodeChange } from './after-change'

/** Publishing is a fact with a date. Answers, letters, index and feed follow from it, all in this transaction. */
export async function goPublic(episode: Episode, transaction: Transaction): Promise<void> {
  await episode.update(
    { state: 'published', publishAt: null, publishedAt: episode.publishedAt ?? now(), withdrawnAt: null },
    { transaction },
  )
  await answerOnPublication(episode, transaction)
  await afterEpisodeChange(episode.id, transaction)
}
