import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { stale } from '@/lib/errors'
import { ANY_EDITION } from '@/lib/http/parse'
import { Episode } from '@/models/episode'
import { readEpisode } from './reads'

/**
 * Claims the next edition of an episode for this transaction. Compared in the WHERE clause, so that of two people
 * who read the same edition one wins.
 * @throws Problem 412 with the episode as it stands
 */
export async function claimEdition(
  actor: Actor,
  id: string,
  edition: number,
  transaction: Transaction,
): Promise<number> {
  const [, rows] = await Episode.update(
    { edition: Episode.sequelize?.literal('edition + 1') as unknown as number },
    { where: edition === ANY_EDITION ? { id } : { id, edition }, returning: ['edition'], transaction },
  )
  const claimed = rows[0]
  if (!claimed) throw stale(await readEpisode(actor, id))
  return claimed.edition
}
