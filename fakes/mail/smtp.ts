import { randomUUID } from 'node:crypto'
import { SMTPServer } from 'smtp-server'
import { readLetter } from './letter'
import type { LetterStore } from './store'

const LARGEST_LETTER = 25 * 1024 * 1024

/** A refusal in SMTP's words: 4xx says try again, 5xx says never. */
function refusal(code: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode: code })
}

async function bytesOf(stream: AsyncIterable<Buffer>): Promise<Buffer> {
  const parts: Buffer[] = []
  for await (const part of stream) parts.push(part)
  return Buffer.concat(parts)
}

/**
 * RFC 5321 on loopback. Takes any sign-in, since a stand-in has no people of its own. One entry per recipient of the
 * envelope: the To line of a letter says who it is for, the envelope says who gets it.
 */
export function smtpServer(store: LetterStore): SMTPServer {
  return new SMTPServer({
    name: 'mailbox.localhost',
    banner: 'Turnrow stand-in mailbox',
    authOptional: true,
    allowInsecureAuth: true,
    // smtp-server offers TLS under a certificate of its own making, which every client rightly refuses.
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    size: LARGEST_LETTER,
    logger: false,
    onAuth: (auth, _session, done) => done(null, { user: auth.username ?? 'anyone' }),
    onData(stream, session, done) {
      const deliver = async () => {
        const source = await bytesOf(stream)
        if (stream.sizeExceeded) throw refusal(552, 'The letter is larger than 25 MB')
        const letter = await readLetter(source, `<${randomUUID()}@mailbox.localhost>`)
        const people = new Set(session.envelope.rcptTo.map(({ address }) => address.toLowerCase()))
        for (const to of people) await store.deliver(to, letter)
      }
      deliver().then(
        () => done(),
        (error: Error) => done('responseCode' in error ? error : refusal(451, 'The letter could not be kept')),
      )
    },
  })
}
