import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { afterEpisodeChange } from '@/lib/episodes/after-change'
import { claimEdition } from '@/lib/episodes/edition'
import { EPISODE, readEpisode } from '@/lib/episodes/reads'
import { type EpisodeView, inMs } from '@/lib/episodes/views'
import { Episode } from '@/models/episode'
import { Reading } from '@/models/reading'
import type { ReadingsInput } from './schema'

/** Replaces the readings of an episode. @throws Problem 412 when somebody saved a newer edition */
export async function saveReadings(
  actor: Actor,
  id: string,
  readings: ReadingsInput,
  edition: number,
): Promise<EpisodeView> {
  await inTransaction(async (transaction) => {
    permit(actor, 'episode.edit', await Episode.findByPk(id, { transaction }), EPISODE)
    await claimEdition(actor, id, edition, transaction)
    await Reading.destroy({ where: { episodeId: id }, transaction })
    await Reading.bulkCreate(
      readings.map(({ at, quantity, value, unit, note }) => ({
        episodeId: id,
        atMs: inMs(at),
        quantity,
        value,
        unit,
        note: note ?? null,
      })),
      { transaction },
    )
    await afterEpisodeChange(id, transaction)
  })
  return readEpisode(actor, id)
}
