import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { conflict, unprocessable } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { refreshSearch } from '@/lib/search/jobs'
import { Answer } from '@/models/answer'
import { Episode } from '@/models/episode'
import { afterEpisodeChange } from './after-change'
import { claimEdition } from './edition'
import { goPublic } from './go-public'
import { publishDue } from './jobs'
import { EPISODE, readEpisode } from './reads'
import { failingLines } from './rules'
import type { PublishInput } from './schema'
import type { EpisodeView } from './views'
import { walkRoundFacts } from './walk-round'

const locked = (id: string, transaction: Transaction) =>
  Episode.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE })

async function refuseUnready(episode: Episode, transaction: Transaction): Promise<void> {
  const failing = failingLines(await walkRoundFacts(episode, transaction))
  if (failing.length === 0) return
  const errors = failing.map(({ rule, detail }) => ({ path: rule, message: detail }))
  throw unprocessable('The walk-round found something to do first.', errors, { failing })
}

async function schedule(episode: Episode, at: Date, transaction: Transaction): Promise<void> {
  await episode.update({ state: 'scheduled', publishAt: at }, { transaction })
  await enqueue(publishDue, {}, { transaction, startAfter: at, key: `${episode.id}:${at.toISOString()}` })
}

/**
 * Publishes now, or at a time still to come.
 * @throws Problem 412 stale, 409 already published, 422 with the failing lines of the walk-round
 */
export async function publishEpisode(
  actor: Actor,
  id: string,
  { at }: PublishInput,
  edition: number,
): Promise<EpisodeView> {
  await inTransaction(async (transaction) => {
    const episode = permit(actor, 'episode.publish', await locked(id, transaction), EPISODE)
    if (episode.state === 'published') throw conflict('It is published already.')
    await claimEdition(actor, id, edition, transaction)
    await refuseUnready(episode, transaction)
    const when = at ? new Date(at) : now()
    if (when > now()) await schedule(episode, when, transaction)
    else await goPublic(episode, transaction)
  })
  return readEpisode(actor, id)
}

/**
 * Takes a published episode out of sight, or a scheduled one back to the desk. Its address, film and passages are
 * gone for everybody else at once; questions it answered stay answered, without a link, until it is published again.
 * @throws Problem 409 when there is nothing to withdraw
 */
export async function withdrawEpisode(actor: Actor, id: string, edition: number): Promise<EpisodeView> {
  await inTransaction(async (transaction) => {
    const episode = permit(actor, 'episode.publish', await locked(id, transaction), EPISODE)
    await claimEdition(actor, id, edition, transaction)
    if (episode.state === 'scheduled') await episode.update({ state: 'draft', publishAt: null }, { transaction })
    else if (episode.state === 'published')
      await episode.update({ state: 'withdrawn', withdrawnAt: now() }, { transaction })
    else throw conflict('Only a published or scheduled episode can be withdrawn.')
    await afterEpisodeChange(id, transaction)
    for (const { questionId } of await Answer.findAll({ where: { episodeId: id }, transaction }))
      await enqueue(refreshSearch, { kind: 'question', id: questionId }, { transaction, key: `question:${questionId}` })
  })
  return readEpisode(actor, id)
}
