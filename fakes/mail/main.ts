import { startMailFake } from './start'

const smtpPort = Number(process.env.MAIL_SMTP_PORT ?? 2525)
const pagePort = Number(process.env.MAIL_PAGE_PORT ?? 2580)
const directory = process.env.MAIL_DIR ?? '.data/mail'

startMailFake({ smtpPort, pagePort, directory }).then(
  ({ stop }) => {
    console.log(`mailbox: SMTP on 127.0.0.1:${smtpPort}, letters at http://127.0.0.1:${pagePort}/`)
    for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => void stop())
  },
  (error: Error) => {
    console.error(`mailbox: could not start: ${error.message}`)
    process.exitCode = 1
  },
)
