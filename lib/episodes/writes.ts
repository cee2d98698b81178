import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { channelBySlug } from '@/lib/channels/reads'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { conflict } from '@/lib/errors'
import { Answer } from '@/models/answer'
import { Channel } from '@/models/channel'
import { Correction } from '@/models/correction'
import { Episode } from '@/models/episode'
import { Question } from '@/models/question'
import { Season } from '@/models/season'
import { afterEpisodeChange } from './after-change'
import { claimEdition } from './edition'
import { EPISODE, readEpisode } from './reads'
import { freeSlug, slugOf } from './rules'
import type { CorrectionInput, EpisodeInput, EpisodePatch } from './schema'
import { type EpisodeView, inMs } from './views'

/** The season of that year; a new year opens its season. */
async function seasonOf(channelId: string, year: number | null | undefined, transaction: Transaction) {
  if (!year) return null
  const [season] = await Season.findOrCreate({ where: { channelId, year }, transaction })
  return season.id
}

/** Makes a draft at the desk. Number and address are the channel's next free ones. @throws Problem 401, 403, 404 */
export async function createEpisode(actor: Actor, slug: string, input: EpisodeInput): Promise<EpisodeView> {
  const channel = permit(actor, 'episode.create', await channelBySlug(slug))
  const { id } = await inTransaction(async (transaction) => {
    // Held until commit: two new episodes at once get two numbers.
    await Channel.findByPk(channel.id, { transaction, lock: true })
    const taken = await Episode.findAll({
      where: { channelId: channel.id },
      attributes: ['slug', 'number'],
      transaction,
    })
    const year = input.season ?? (input.filmedOn ? Number(input.filmedOn.slice(0, 4)) : null)
    return Episode.create(
      {
        channelId: channel.id,
        number: Math.max(0, ...taken.map(({ number }) => number)) + 1,
        slug: freeSlug(slugOf(input.title), new Set(taken.map((row) => row.slug))),
        title: input.title,
        summary: input.summary ?? null,
        filmedOn: input.filmedOn ?? null,
        language: input.language,
        seasonId: await seasonOf(channel.id, year, transaction),
        createdBy: actor.id,
      },
      { transaction },
    )
  })
  return readEpisode(actor, id)
}

/** @throws Problem 412 when somebody saved a newer edition */
export async function editEpisode(
  actor: Actor,
  id: string,
  patch: EpisodePatch,
  edition: number,
): Promise<EpisodeView> {
  const { id: personId } = requirePerson(actor)
  await inTransaction(async (transaction) => {
    const row = permit(actor, 'episode.edit', await Episode.findByPk(id, { transaction }), EPISODE)
    await claimEdition(actor, id, edition, transaction)
    const { season, cautionsConfirmed, ...plain } = patch
    await Episode.update(
      {
        ...plain,
        ...(season === undefined ? {} : { seasonId: await seasonOf(row.channelId, season, transaction) }),
        ...(cautionsConfirmed === undefined
          ? {}
          : {
              cautionsConfirmedAt: cautionsConfirmed ? now() : null,
              cautionsConfirmedBy: cautionsConfirmed ? personId : null,
            }),
      },
      { where: { id }, transaction },
    )
    await afterEpisodeChange(id, transaction)
  })
  return readEpisode(actor, id)
}

/**
 * Deletes an episode that was never published. Questions booked for it go back to the queue.
 * @throws Problem 409 when it was published once: links and answers lean on it, so it can only be withdrawn
 */
export async function deleteEpisode(actor: Actor, id: string, edition: number): Promise<void> {
  await inTransaction(async (transaction) => {
    const row = permit(actor, 'episode.delete', await Episode.findByPk(id, { transaction }), EPISODE)
    if (row.publishedAt) throw conflict('It was published once, so people may hold links to it. Withdraw it instead.')
    await claimEdition(actor, id, edition, transaction)
    await Answer.destroy({ where: { episodeId: id }, transaction })
    const back = { state: 'queued' as const, bookedEpisodeId: null }
    await Question.update(back, { where: { bookedEpisodeId: id, state: 'booked' }, transaction })
    await Question.update({ bookedEpisodeId: null }, { where: { bookedEpisodeId: id }, transaction })
    await Question.update({ episodeId: null, atMs: null }, { where: { episodeId: id }, transaction })
    await Episode.destroy({ where: { id }, transaction })
  })
}

/** Pins what was said wrong, and what is right, to a time of the episode. */
export async function addCorrection(actor: Actor, id: string, input: CorrectionInput): Promise<EpisodeView> {
  await inTransaction(async (transaction) => {
    permit(actor, 'episode.edit', await Episode.findByPk(id, { transaction }), EPISODE)
    const { at, said, right } = input
    await Correction.create(
      { episodeId: id, atMs: inMs(at), said, amended: right, createdBy: actor.id },
      { transaction },
    )
  })
  return readEpisode(actor, id)
}
