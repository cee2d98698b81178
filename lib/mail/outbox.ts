import type { Transaction } from 'sequelize'
import { enqueue } from '@/lib/jobs/queue'
import { Letter } from '@/models/letter'
import { sendLetter } from './jobs'

export type NewLetter = {
  /** What makes this letter the only one of its kind, such as `answered:<question>:<person>`. */
  key: string
  to: { address: string; name?: string }
  subject: string
  text: string
  html?: string
  headers?: Record<string, string>
}

/** No header may grow a second line. */
const oneLine = (value: string) => value.replace(/[\r\n\u0000]+/g, ' ').trim()

/**
 * Puts a letter in the outbox as part of the caller's transaction; the worker sends it.
 * A second letter with the same key is dropped.
 */
export async function post(letter: NewLetter, { transaction }: { transaction: Transaction }): Promise<void> {
  const { key, to, subject, text, html, headers = {} } = letter
  const [row, made] = await Letter.findOrCreate({
    where: { key },
    defaults: {
      key,
      toAddress: oneLine(to.address),
      toName: to.name ? oneLine(to.name) : null,
      subject: oneLine(subject),
      text,
      html: html ?? null,
      headers,
    },
    transaction,
  })
  if (made) await enqueue(sendLetter, { id: row.id }, { transaction, key: `letter:${row.id}` })
}
