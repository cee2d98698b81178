import { appendFile, mkdtemp, rm } from 'node:fs/promises'
import { connect } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { createTransport, type SendMailOptions } from 'nodemailer'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import type { Letter } from '@/fakes/mail/letter'
import { startMailFake } from '@/fakes/mail/start'
import { freePorts } from '../../support/free-ports'

// Real servers and a real disk: a busy machine is not a failure.
vi.setConfig({ testTimeout: 30_000, hookTimeout: 30_000 })

let directory: string
let ports: { smtpPort: number; pagePort: number }
let fake: Awaited<ReturnType<typeof startMailFake>>

beforeEach(async () => {
  directory = await mkdtemp(join(tmpdir(), 'mailbox-'))
  const [smtpPort = 0, pagePort = 0] = await freePorts(2)
  ports = { smtpPort, pagePort }
  fake = await startMailFake({ ...ports, directory })
})
afterEach(async () => {
  await fake.stop()
  await rm(directory, { recursive: true, force: true })
})

const address = (path: string) => `http://127.0.0.1:${ports.pagePort}${path}`
const page = async (path: string) => (await fetch(address(path))).text()
const letters = async (query = '') => (await (await fetch(address(`/messages${query}`))).json()) as Letter[]

async function send(more: SendMailOptions = {}) {
  const transport = createTransport(`smtp://127.0.0.1:${ports.smtpPort}`)
  try {
    return await transport.sendMail({
      from: { name: 'Turnrow', address: 'post@turnrow.example' },
      to: 'june@reader.example',
      subject: 'Your question was answered',
      text: 'Watch the answer: http://127.0.0.1:3000/channels/a/episodes/b?t=125.',
      ...more,
    })
  } finally {
    transport.close()
  }
}

async function restart() {
  await fake.stop()
  fake = await startMailFake({ ...ports, directory })
}

test('a letter sent over SMTP is listed with its decoded words and its headers', async () => {
  await send({
    subject: 'Réponse: 31 °F',
    text: 'Größe: 19 plants = enough. '.repeat(20),
    html: '<p>Hi</p>',
    headers: { 'List-Unsubscribe': '<http://127.0.0.1:3000/stop/abc>' },
  })
  const [letter] = await letters()
  expect(letter).toMatchObject({
    to: 'june@reader.example',
    subject: 'Réponse: 31 °F',
    html: '<p>Hi</p>',
    copies: 1,
    headers: { 'list-unsubscribe': '<http://127.0.0.1:3000/stop/abc>' },
  })
  expect(letter?.from).toContain('post@turnrow.example')
  expect(letter?.text).toContain('Größe: 19 plants = enough.')
  expect(Date.parse(letter?.receivedAt ?? '')).not.toBeNaN()
  expect(await (await fetch(address(`/messages/${letter?.id}`))).json()).toEqual(letter)
})

test('the newest letter comes first and one mailbox can be asked for', async () => {
  await send({ subject: 'First' })
  await send({ subject: 'Second', to: 'Nell@AlderFork.example' })
  expect((await letters()).map(({ subject }) => subject)).toEqual(['Second', 'First'])
  expect((await letters('?to=nell@alderfork.example')).map(({ subject }) => subject)).toEqual(['Second'])
})

test('a letter to two people is one entry in each mailbox, blind copies included', async () => {
  await send({ to: ['june@reader.example', 'nell@alderfork.example'], bcc: 'imani@alderfork.example' })
  const all = await letters()
  expect(all.map(({ to }) => to).sort()).toEqual([
    'imani@alderfork.example',
    'june@reader.example',
    'nell@alderfork.example',
  ])
  expect(all.every(({ headers }) => headers.bcc === undefined)).toBe(true)
})

test('a second copy of the same Message-ID is counted, not listed twice', async () => {
  await send({ messageId: '<outbox-1@turnrow.example>' })
  await send({ messageId: '<outbox-1@turnrow.example>' })
  await send({ messageId: '<outbox-2@turnrow.example>' })
  expect((await letters()).map(({ messageId, copies }) => [messageId, copies])).toEqual([
    ['<outbox-2@turnrow.example>', 1],
    ['<outbox-1@turnrow.example>', 2],
  ])
})

test('a line break in a subject adds no header and no recipient', async () => {
  await send({ subject: 'Hello\r\nBcc: thief@away.example\r\nX-Extra: yes' })
  const all = await letters()
  expect(all).toHaveLength(1)
  expect(all[0]?.to).toBe('june@reader.example')
  expect(all[0]?.headers).not.toHaveProperty('bcc')
  expect(all[0]?.headers).not.toHaveProperty('x-extra')
})

test('a header that bears the name of an object property is only text', async () => {
  await send({ headers: { Constructor: 'one', '__proto__-like': 'two' } })
  const [letter] = await letters()
  expect(letter?.headers).toMatchObject({ constructor: 'one' })
})

test('letters and their counts are there after a restart, and half a line from a kill is not', async () => {
  await send({ messageId: '<kept@turnrow.example>' })
  await send({ messageId: '<kept@turnrow.example>' })
  await fake.stop()
  await appendFile(join(directory, 'letters.jsonl'), '{"letter":{"id":"torn')
  fake = await startMailFake({ ...ports, directory })
  await send({ subject: 'After' })
  await restart()
  expect((await letters()).map(({ subject, copies }) => [subject, copies])).toEqual([
    ['After', 1],
    ['Your question was answered', 2],
  ])
})

test('a line dropped in mid-letter keeps nothing and leaves the mailbox open', async () => {
  await new Promise<void>((closed) => {
    const line = connect(ports.smtpPort, '127.0.0.1')
    const words = ['EHLO a', 'MAIL FROM:<a@b.example>', 'RCPT TO:<june@reader.example>', 'DATA', 'Subject: half']
    line.on('data', () => {
      const next = words.shift()
      if (next) line.write(`${next}\r\n`)
      if (words.length === 0) line.destroy()
    })
    line.on('close', () => closed())
    line.on('error', () => undefined)
  })
  await send({ subject: 'Whole' })
  expect((await letters()).map(({ subject }) => subject)).toEqual(['Whole'])
})

test('clearing the mailbox clears the disk as well', async () => {
  await send()
  expect((await fetch(address('/messages'), { method: 'DELETE' })).status).toBe(204)
  await restart()
  expect(await letters()).toEqual([])
  expect(await page('/')).toContain('No letter yet')
})

test('the list says that it is a stand-in, and shows hostile words as words', async () => {
  const hostile = '"><img src=x onerror=alert(1)><script>alert(2)</script>'
  await send({ subject: hostile, text: hostile, from: { name: hostile, address: 'post@turnrow.example' } })
  const [letter] = await letters()
  const shown = [
    await page('/'),
    await page(`/letters/${letter?.id}`),
    await page(`/?to=${encodeURIComponent(hostile)}`),
  ]
  for (const each of shown) expect(each).not.toMatch(/<img|<script/)
  expect(shown[0]).toContain('Nothing leaves this machine')
  expect(shown[0]).toContain('&lt;img src=x onerror=alert(1)&gt;')
})

test('addresses in the text are links without the full stop behind them', async () => {
  await send()
  const [letter] = await letters()
  const shown = await page(`/letters/${letter?.id}`)
  const link = 'http://127.0.0.1:3000/channels/a/episodes/b?t=125'
  expect(shown).toContain(`<a href="${link}" rel="noreferrer">${link}</a>.`)
})

test('formatted letters are shown where no script can run', async () => {
  await send({ html: '<script>alert(1)</script><a href="https://turnrow.example/">in</a>' })
  const [letter] = await letters()
  const shown = await page(`/letters/${letter?.id}`)
  expect(shown).toMatch(/<iframe [^>]*sandbox="allow-popups allow-popups-to-escape-sandbox"/)
  expect(shown).not.toContain('<script')
  const policy = (await fetch(address(`/letters/${letter?.id}/formatted`))).headers.get('content-security-policy')
  expect(policy).toContain("default-src 'none'")
  expect(policy).toContain('sandbox allow-popups')
  expect(policy).not.toContain('allow-scripts')
})

test('what is not there is not found', async () => {
  expect((await fetch(address('/messages/nothing'))).status).toBe(404)
  expect((await fetch(address('/letters/nothing'))).status).toBe(404)
  expect((await fetch(address('/fonts/..%2f..%2fpackage.json'))).status).toBe(404)
  expect((await fetch(address('/messages'), { method: 'POST' })).status).toBe(405)
  expect((await fetch(address('/%E0%A4%A'))).status).toBe(400)
})

test('a taken port is said, and nothing is left running', async () => {
  const [pagePort = 0] = await freePorts(1)
  await expect(startMailFake({ smtpPort: ports.smtpPort, pagePort, directory })).rejects.toThrow('EADDRINUSE')
  await expect(fetch(`http://127.0.0.1:${pagePort}/`)).rejects.toThrow()
})
