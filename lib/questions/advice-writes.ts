import type { Actor } from '@/lib/auth/actor'
import { env } from '@/lib/env'
import { conflict } from '@/lib/errors'
import { post } from '@/lib/mail/outbox'
import { Channel } from '@/models/channel'
import { User } from '@/models/user'
import { advisersOf } from './asker-reads'
import { atDesk } from './desk-writes'
import { adviserLetter, detailLetter } from './letters'
import { moveQuestion } from './moves'
import { questionUrl } from './views'

/** Asks the asker for more, by mail. @throws Problem 409 when the state does not allow it or the asker has left */
export const askForDetail = (actor: Actor, id: string, { message }: { message: string }) =>
  atDesk(actor, id, async (question, transaction) => {
    const event = await moveQuestion(actor, question, 'ask-detail', { detail: message }, transaction)
    const asker = question.askerId ? await User.findByPk(question.askerId, { transaction }) : null
    if (!asker || asker.disabledAt) throw conflict('Whoever asked this has left, and cannot be asked.')
    const channel = await Channel.findByPk(question.channelId, { transaction, rejectOnEmpty: true })
    const about = { name: asker.name, title: question.title, channel: channel.name, message }
    const words = detailLetter({ ...about, questionUrl: env().BASE_URL + questionUrl(id) })
    await post({ key: `detail:${event}`, to: { address: asker.email, name: asker.name }, ...words }, { transaction })
  })

/** Puts a question before the channel's advisers, by mail. @throws Problem 409 when the channel has none */
export const sendToAdviser = (actor: Actor, id: string, { note }: { note: string }) =>
  atDesk(actor, id, async (question, transaction) => {
    const event = await moveQuestion(actor, question, 'to-adviser', { detail: note || null }, transaction)
    const advisers = await advisersOf(question.channelId, transaction)
    if (advisers.length === 0) throw conflict('No adviser belongs to this channel yet. The owner can invite one.')
    const channel = await Channel.findByPk(question.channelId, { transaction, rejectOnEmpty: true })
    const deskUrl = `${env().BASE_URL}/desk/${channel.slug}/questions?question=${id}`
    for (const { id: userId, email, name } of advisers) {
      const words = adviserLetter({
        name,
        title: question.title,
        body: question.body,
        channel: channel.name,
        note,
        deskUrl,
      })
      await post({ key: `adviser:${event}:${userId}`, to: { address: email, name }, ...words }, { transaction })
    }
  })
