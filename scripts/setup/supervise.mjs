import { spawn } from 'node:child_process'
import { mkdirSync, openSync, closeSync, readFileSync, renameSync, statSync } from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { endGroup } from './run.mjs'
import { Trouble } from './trouble.mjs'

const longestWait = 15_000
const steadyAfter = 30_000
const logLimit = 20 * 1024 ** 2

/** Milliseconds to wait before the nth new start in a row: at once, then doubling up to a ceiling. */
export const backoff = (restarts) => Math.min(longestWait, restarts === 0 ? 100 : 500 * 2 ** (restarts - 1))

function openLog(file) {
  mkdirSync(path.dirname(file), { recursive: true })
  if ((statSync(file, { throwIfNoEntry: false })?.size ?? 0) > logLimit) renameSync(file, `${file}.1`)
  return openSync(file, 'a', 0o600)
}

const lastLines = (file) => readFileSync(file, 'utf8').trim().split('\n').slice(-12).join('\n')

/**
 * Keeps one server running. It is started again when it ends by itself, with growing pauses;
 * one that ends before it was ever `isReady` fails the start instead, with its last words.
 * `loud` sends its output to the terminal (dev), else it goes to `logFile`.
 */
export function supervise({
  name,
  args,
  cwd,
  env,
  logFile,
  loud = false,
  isReady,
  readySeconds = 90,
  onPid = () => {},
}) {
  const state = { child: null, ended: Promise.resolve(), stopping: false, ready: false, restarts: 0 }

  function launch() {
    const log = loud ? 'inherit' : openLog(logFile)
    const follow = path.join(import.meta.dirname, 'follow-parent.mjs')
    const child = spawn(process.execPath, ['--import', follow, ...args], {
      cwd,
      env,
      // A group of its own: Ctrl-C must reach us alone, for the order of the end is ours.
      detached: true,
      stdio: ['ignore', log, log, 'ipc'],
    })
    if (!loud) closeSync(log)
    state.child = child
    onPid(child.pid)
    const since = performance.now()
    state.ended = new Promise((resolve) => child.once('exit', resolve))
    child.once('exit', (code, signal) => onExit(child, performance.now() - since, signal ?? `status ${code}`))
  }

  async function onExit(child, lived, how) {
    // What it had started (an ffmpeg) would write on beside its successor.
    endGroup(child.pid, 'SIGKILL')
    onPid(null)
    if (state.stopping || !state.ready) return
    state.restarts = lived > steadyAfter ? 0 : state.restarts
    const wait = backoff(state.restarts)
    state.restarts += 1
    console.log(`! ${name} ended (${how}); starting it again${wait > 1000 ? ` in ${wait / 1000} s` : ''}`)
    await sleep(wait)
    if (!state.stopping) launch()
  }

  async function start() {
    launch()
    const until = performance.now() + readySeconds * 1000
    while (performance.now() < until) {
      if (state.stopping) return
      if (state.child.exitCode !== null || state.child.signalCode !== null) throw failure('ended at once')
      if (await isReady()) return void (state.ready = true)
      await sleep(100)
    }
    throw failure(`was not ready after ${readySeconds} s`)
  }

  const failure = (what) =>
    new Trouble(`${name} ${what}.${loud ? '' : ` Its last words (${logFile}):\n${lastLines(logFile)}`}`)

  /** Asks it to end and waits; after `seconds` it and all it started are killed. */
  async function stop(seconds = 15) {
    state.stopping = true
    if (!state.child || state.child.exitCode !== null || state.child.signalCode !== null) return
    state.child.kill('SIGTERM')
    const ended = await Promise.race([state.ended.then(() => true), sleep(seconds * 1000, false, { ref: false })])
    if (ended) return
    console.log(`! ${name} did not end within ${seconds} s and was killed`)
    endGroup(state.child.pid, 'SIGKILL')
    await state.ended
  }

  const kill = () => {
    state.stopping = true
    if (state.child) endGroup(state.child.pid, 'SIGKILL')
  }

  return { name, start, stop, kill }
}
