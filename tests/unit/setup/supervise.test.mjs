import { spawn } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { lockFolder } from '../../../scripts/setup/lock.mjs'
import { sweepLeftovers } from '../../../scripts/setup/leftovers.mjs'
import { freePort, mustBeFree } from '../../../scripts/setup/ports.mjs'
import { SupervisedServer } from '../../../scripts/setup/supervise.mjs'

let folder
let server
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'turnrow-supervise-'))
  vi.spyOn(console, 'log').mockImplementation(() => {})
})
afterEach(async () => {
  await server?.stop(1)
  rmSync(folder, { recursive: true })
  vi.restoreAllMocks()
})

const alive = (pid) => {
  try {
    return process.kill(pid, 0)
  } catch {
    return false
  }
}

function plan(code, more = {}) {
  const pids = []
  server = new SupervisedServer({
    name: 'trial',
    args: ['-e', code],
    cwd: folder,
    env: { ...process.env, TURNROW_HOME: folder },
    logFile: path.join(folder, 'trial.log'),
    isReady: (said) => said.includes('ready'),
    onPid: (pid) => pid && pids.push(pid),
    ...more,
  })
  return pids
}

it('starts a server again that was killed, and everything it had started dies with it', async () => {
  const child = `require('child_process').spawn('sleep', ['60']).pid`
  const pids = plan(`console.log('ready', ${child}); setInterval(() => {}, 1000)`)
  await server.start()
  const helper = Number(readFileSync(path.join(folder, 'trial.log'), 'utf8').match(/ready (\d+)/)[1])
  expect(alive(helper)).toBe(true)
  process.kill(pids[0], 'SIGKILL')
  await vi.waitFor(() => expect(pids).toHaveLength(2), 10_000)
  expect(alive(pids[1])).toBe(true)
  await vi.waitFor(() => expect(alive(helper)).toBe(false), 10_000)
})

it('does not start again what it was told to stop, and kills what will not listen', async () => {
  const pids = plan(`process.on('SIGTERM', () => {}); console.log('ready'); setInterval(() => {}, 1000)`)
  await server.start()
  await server.stop(0.3)
  expect(alive(pids[0])).toBe(false)
  expect(pids).toHaveLength(1)
})

it('fails the start with the last words of a server that ends before it is ready', async () => {
  plan(`console.error('no such table'); process.exit(3)`)
  await expect(server.start()).rejects.toThrow(/trial ended at once[^]*no such table/)
})

it('does not take the words of an earlier life for readiness', async () => {
  plan(`console.log('ready'); setInterval(() => {}, 1000)`)
  await server.start()
  await server.stop(1)
  plan(`console.log('still thinking'); setInterval(() => {}, 1000)`, { readySeconds: 1 })
  await expect(server.start()).rejects.toThrow(/was not ready after 1 s/)
})

it('finds and ends what a killed start left behind, known by its mark, and nothing else', async () => {
  const sleeper = (home) => spawn('sleep', ['60'], { env: { ...process.env, TURNROW_HOME: home } })
  const [ours, other] = [sleeper(folder), sleeper(`${folder}-other`)]
  const ended = new Promise((resolve) => ours.once('exit', (code, signal) => resolve(signal)))
  expect(await sweepLeftovers(folder)).toBe(1)
  expect(await ended).toBe('SIGTERM')
  expect(alive(other.pid)).toBe(true)
  other.kill()
  expect(await sweepLeftovers(folder)).toBe(0)
})

it('allows one start per folder and names the one that runs', async () => {
  const release = await lockFolder(folder, 'http://localhost:3000')
  await expect(lockFolder(folder, 'x')).rejects.toThrow(
    `already running from this folder (process ${process.pid}, http://localhost:3000)`,
  )
  release()
  await vi.waitFor(async () => (await lockFolder(folder, 'x'))(), 5000)
})

it('says which port is busy and which setting moves it', async () => {
  const port = await freePort()
  await mustBeFree(port, { what: 'the web', setting: 'PORT' })
  const other = createServer().listen(port, '127.0.0.1')
  await new Promise((resolve) => other.once('listening', resolve))
  await expect(mustBeFree(port, { what: 'the web', setting: 'PORT' })).rejects.toThrow(
    `Port ${port} for the web is in use by another program; end it or set PORT to a free port.`,
  )
  await new Promise((resolve) => other.close(resolve))
})
