import { once } from 'node:events'
import type { Server } from 'node:http'
import { smtpServer } from './smtp'
import { openLetterStore } from './store'
import { mailboxServer } from './web'

type MailFake = { stop: () => Promise<void> }

async function listen(server: Server, port: number): Promise<void> {
  server.listen(port, '127.0.0.1')
  await once(server, 'listening')
}

/**
 * A stand-in for the mail service: SMTP in, a mailbox page and JSON out, both on 127.0.0.1. Letters are kept in
 * `directory` over restarts. Rejects when a port is taken.
 */
export async function startMailFake(where: {
  smtpPort: number
  pagePort: number
  directory: string
}): Promise<MailFake> {
  const store = await openLetterStore(where.directory)
  const web = mailboxServer(store)
  const smtp = smtpServer(store)
  const stop = async () => {
    web.closeAllConnections()
    await Promise.all([
      new Promise<void>((closed) => web.close(() => closed())),
      new Promise<void>((closed) => smtp.close(() => closed())),
    ])
  }
  try {
    await listen(web, where.pagePort)
    await new Promise<void>((ready, failed) => {
      smtp.once('error', failed)
      smtp.listen(where.smtpPort, '127.0.0.1', () => ready())
    })
  } catch (error) {
    await stop()
    throw error
  }
  // A client that drops its line in mid-letter is everyday; it must not take the mailbox down.
  smtp.on('error', (error) => console.error(`mailbox: ${error.message}`))
  return { stop }
}
