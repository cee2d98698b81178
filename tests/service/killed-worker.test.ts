import { type ChildProcess, spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startMailFake } from '@/fakes/mail/start'
import { inTransaction } from '@/lib/db'
import { post } from '@/lib/mail/outbox'
import { Letter } from '@/models/letter'
import { freshDatabase } from '../support/database'
import { freePorts } from '../support/free-ports'

freshDatabase()

const LETTERS = 40
const mailFolder = mkdtempSync(path.join(tmpdir(), 'turnrow-mail-'))
let mailbox: Awaited<ReturnType<typeof startMailFake>>
let pagePort = 0
let smtpPort = 0

beforeAll(async () => {
  ;[smtpPort = 0, pagePort = 0] = await freePorts(2)
  mailbox = await startMailFake({ smtpPort, pagePort, directory: mailFolder })
})

afterAll(async () => {
  await mailbox.stop()
  rmSync(mailFolder, { recursive: true, force: true })
})

const startWorker = (): ChildProcess =>
  spawn(process.execPath, ['--import', 'tsx', 'scripts/worker.ts'], {
    env: { ...process.env, SMTP_URL: `smtp://127.0.0.1:${smtpPort}` },
    stdio: 'ignore',
  })

async function endWith(child: ChildProcess, signal: 'SIGKILL' | 'SIGTERM'): Promise<void> {
  const gone = once(child, 'exit')
  child.kill(signal)
  await gone
}

const sent = () => Letter.count({ where: { state: 'sent' } })

async function until(reached: () => Promise<boolean>): Promise<void> {
  for (let left = 600; !(await reached()); left--) {
    if (left === 0) throw new Error('it never came to that')
    await sleep(100)
  }
}

describe('a worker that is killed again and again while it sends letters', () => {
  it('loses none and shows none twice', { timeout: 180_000 }, async () => {
    await inTransaction(async (transaction) => {
      for (let n = 0; n < LETTERS; n++)
        await post(
          { key: `letter-${n}`, to: { address: `asker-${n}@reader.example` }, subject: `Answered ${n}`, text: 'Here.' },
          { transaction },
        )
    })
    for (const share of [0.1, 0.4, 0.7]) {
      const worker = startWorker()
      await until(async () => (await sent()) >= LETTERS * share)
      await endWith(worker, 'SIGKILL')
    }
    expect(await sent()).toBeLessThan(LETTERS)
    const last = startWorker()
    await until(async () => (await sent()) === LETTERS)
    await endWith(last, 'SIGTERM')

    const letters = (await (await fetch(`http://127.0.0.1:${pagePort}/messages`)).json()) as { to: unknown }[]
    const addresses = letters.map(({ to }) => JSON.stringify(to))
    expect(addresses).toHaveLength(LETTERS)
    expect(new Set(addresses).size).toBe(LETTERS)
  })
})
