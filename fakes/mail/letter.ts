import { simpleParser, type ParsedMail } from 'mailparser'

/** One letter in one mailbox. `copies` counts deliveries under the same Message-ID; a mailbox shows them as one. */
export type Letter = {
  id: string
  messageId: string
  to: string
  from: string
  subject: string
  text: string
  html: string | null
  headers: Record<string, string | string[]>
  attachments: { filename: string; contentType: string; bytes: number }[]
  receivedAt: string
  copies: number
}

export type ReadLetter = Omit<Letter, 'id' | 'to' | 'receivedAt' | 'copies'>

/** Header names in lower case, values unfolded as they came; a repeated header keeps every value. */
function headersOf(mail: ParsedMail): Letter['headers'] {
  const headers: Letter['headers'] = Object.create(null) as Letter['headers']
  for (const { key, line } of mail.headerLines) {
    const value = line
      .slice(line.indexOf(':') + 1)
      .replace(/\r?\n[ \t]+/g, ' ')
      .trim()
    const before = headers[key]
    headers[key] = before === undefined ? value : [before, value].flat()
  }
  return headers
}

/** Reads a message in RFC 5322 form. A message without a Message-ID gets `fallbackId`, so that it still counts as one. */
export async function readLetter(source: Buffer, fallbackId: string): Promise<ReadLetter> {
  const mail = await simpleParser(source, { skipTextToHtml: true, skipHtmlToText: true })
  return {
    messageId: mail.messageId ?? fallbackId,
    from: mail.from?.text ?? '',
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || null,
    headers: headersOf(mail),
    attachments: mail.attachments.map(({ filename, contentType, size }) => ({
      filename: filename ?? 'without a name',
      contentType,
      bytes: size,
    })),
  }
}
