import { Op } from 'sequelize'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { env } from '@/lib/env'
import { post } from '@/lib/mail/outbox'
import { Channel } from '@/models/channel'
import { Episode } from '@/models/episode'
import { Membership } from '@/models/membership'
import { User } from '@/models/user'
import type { Transaction } from 'sequelize'
import { goPublic } from './go-public'
import { failingLines } from './rules'
import { walkRoundFacts } from './walk-round'

/** What was set for an hour and cannot go out at it: back to a draft, and the owners are told why. */
async function holdBack(episode: Episode, why: string, transaction: Transaction): Promise<void> {
  await episode.update({ state: 'draft', publishAt: null, edition: episode.edition + 1 }, { transaction })
  const channel = await Channel.findByPk(episode.channelId, { transaction })
  const owners = await Membership.findAll({ where: { channelId: episode.channelId, role: 'owner' }, transaction })
  for (const { userId } of owners) {
    const user = await User.findByPk(userId, { transaction })
    if (!user) continue
    await post(
      {
        key: `held-back:${episode.id}:${episode.edition}:${userId}`,
        to: { address: user.email, name: user.name },
        subject: `Not published: ${episode.title}`,
        text: `“${episode.title}” was due now, but the walk-round stops it: ${why}\n\nIt is a draft again:\n${env().BASE_URL}/desk/${channel?.slug}/episodes/${episode.id}/walk-round`,
      },
      { transaction },
    )
  }
}

async function publishNext(): Promise<boolean> {
  return inTransaction(async (transaction) => {
    const episode = await Episode.findOne({
      where: { state: 'scheduled', publishAt: { [Op.lte]: now() } },
      order: [['publishAt', 'asc']],
      lock: transaction.LOCK.UPDATE,
      skipLocked: true,
      transaction,
    })
    if (!episode) return false
    const failing = failingLines(await walkRoundFacts(episode, transaction))
    if (failing.length > 0) await holdBack(episode, failing.map(({ detail }) => detail).join(' '), transaction)
    else {
      await episode.update({ edition: episode.edition + 1 }, { transaction })
      await goPublic(episode, transaction)
    }
    return true
  })
}

/** Publishes every scheduled episode whose hour has come, one transaction each. Runs twice safely. */
export async function publishWhatIsDue(): Promise<void> {
  while (await publishNext());
}
