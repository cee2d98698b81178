import { createTransport, type Transporter } from 'nodemailer'
import { now } from '@/lib/clock'
import { db } from '@/lib/db'
import { env } from '@/lib/env'
import { Letter } from '@/models/letter'

let transport: Transporter | undefined
const post = () => (transport ??= createTransport(env().SMTP_URL))

const isFinal = (failure: unknown) => {
  const code = (failure as { responseCode?: number }).responseCode ?? 0
  return code >= 500 && code < 600
}

/**
 * Sends one waiting letter. Its id is the Message-ID, so a copy sent again after a crash is known as the same letter.
 * A refusal for good (5xx) is written down and not tried again; anything else is thrown, and the queue tries later.
 */
export async function sendLetterById({ id }: { id: string }): Promise<void> {
  const letter = await Letter.findByPk(id)
  if (!letter || letter.state !== 'waiting') return
  await letter.update({ attempts: letter.attempts + 1 })
  try {
    await post().sendMail({
      messageId: `<${letter.id}@${new URL(env().BASE_URL).hostname}>`,
      from: env().MAIL_FROM,
      to: { address: letter.toAddress, name: letter.toName ?? '' },
      subject: letter.subject,
      text: letter.text,
      html: letter.html ?? undefined,
      headers: letter.headers as Record<string, string>,
      date: letter.createdAt,
      disableFileAccess: true,
      disableUrlAccess: true,
    })
  } catch (failure) {
    const lastError = failure instanceof Error ? failure.message.slice(0, 500) : 'unknown'
    await letter.update(isFinal(failure) ? { state: 'failed', lastError } : { lastError })
    if (isFinal(failure)) return
    throw failure
  }
  await db().query(`update letters set state = 'sent', sent_at = $2, last_error = null where id = $1`, {
    bind: [id, now()],
  })
}
