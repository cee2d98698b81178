import { spawn } from 'node:child_process'
import { closeSync, fstatSync, mkdirSync, openSync, readFileSync, renameSync, statSync } from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { endGroup } from './run.mjs'
import { sentenceFor, Trouble } from './trouble.mjs'

const longestWait = 15_000
const steadyAfter = 30_000
const logLimit = 20 * 1024 ** 2
const followParent = path.join(import.meta.dirname, 'follow-parent.mjs')

/** Milliseconds to wait before the nth new start in a row: nearly at once, then doubling up to a ceiling. */
export const backoff = (restarts) => Math.min(longestWait, restarts === 0 ? 100 : 500 * 2 ** (restarts - 1))

function openLog(file) {
  mkdirSync(path.dirname(file), { recursive: true })
  if ((statSync(file, { throwIfNoEntry: false })?.size ?? 0) > logLimit) renameSync(file, `${file}.1`)
  return openSync(file, 'a', 0o600)
}

/**
 * One server, kept running: started again when it ends by itself, with growing pauses.
 * One that ends before it was ever ready fails the start instead, with its last words.
 */
export class SupervisedServer {
  #child = null
  #ended = Promise.resolve()
  #stopping = false
  #ready = false
  #restarts = 0
  #logFrom = 0

  /**
   * `plan`: { name, args (after node), cwd, env, logFile, isReady(what this life has written to its log) → boolean,
   * loud? (output to the terminal instead), readySeconds?, isStopping?, onPid? }
   */
  constructor(plan) {
    this.plan = { loud: false, readySeconds: 90, isStopping: () => false, onPid: () => {}, ...plan }
  }

  /** Starts it and waits until it is ready. Throws Trouble where it ends first or takes too long. */
  async start() {
    const { readySeconds, isReady, isStopping } = this.plan
    this.#launch()
    const until = performance.now() + readySeconds * 1000
    while (performance.now() < until && !this.#stopping && !isStopping()) {
      if (this.#isGone()) throw this.#failure('ended at once')
      if (await isReady(this.#said())) return void (this.#ready = true)
      await sleep(100)
    }
    if (!this.#stopping && !isStopping()) throw this.#failure(`was not ready after ${readySeconds} s`)
  }

  /** Asks it to end and waits; after `seconds` it and all it started are killed. */
  async stop(seconds = 15) {
    this.#stopping = true
    if (!this.#child || this.#isGone()) return
    this.#child.kill('SIGTERM')
    if (await Promise.race([this.#ended.then(() => true), sleep(seconds * 1000, false, { ref: false })])) return
    console.log(`! ${this.plan.name} did not end within ${seconds} s and was killed`)
    endGroup(this.#child.pid, 'SIGKILL')
    await this.#ended
  }

  /** Kills it and all it started, now. */
  kill() {
    this.#stopping = true
    if (this.#child) endGroup(this.#child.pid, 'SIGKILL')
  }

  #launch() {
    const { args, cwd, env, logFile, loud, onPid } = this.plan
    const log = loud ? 'inherit' : openLog(logFile)
    if (!loud) this.#logFrom = fstatSync(log).size
    // A group of its own (detached): Ctrl-C must reach us alone, for the order of the end is ours.
    const options = {
      cwd,
      env: { ...env, TURNROW_STARTER: String(process.pid) },
      detached: true,
      stdio: ['ignore', log, log, 'ipc'],
    }
    const child = spawn(process.execPath, ['--import', followParent, ...args], options)
    if (!loud) closeSync(log)
    this.#child = child
    onPid(child.pid)
    const since = performance.now()
    this.#ended = new Promise((resolve) => child.once('exit', resolve))
    child.once('exit', (code, signal) => this.#onExit(performance.now() - since, signal ?? `status ${code}`))
  }

  async #onExit(lived, how) {
    const { name, onPid } = this.plan
    // What it had started (an ffmpeg) would write on beside its successor.
    endGroup(this.#child.pid, 'SIGKILL')
    onPid(null)
    if (this.#stopping || !this.#ready) return
    this.#restarts = lived > steadyAfter ? 0 : this.#restarts
    const wait = backoff(this.#restarts)
    this.#restarts += 1
    console.log(`! ${name} ended (${how}); starting it again${wait > 1000 ? ` in ${wait / 1000} s` : ''}`)
    await this.#startAgain(wait)
  }

  async #startAgain(wait) {
    await sleep(wait)
    if (this.#stopping) return
    try {
      this.#launch()
    } catch (error) {
      // A full disk takes no new log either; whoever makes room should find us still trying.
      console.log(`! ${this.plan.name}: ${sentenceFor(error)}`)
      await this.#startAgain(longestWait)
    }
  }

  #isGone = () => this.#child.exitCode !== null || this.#child.signalCode !== null

  #said = () => (this.plan.loud ? '' : readFileSync(this.plan.logFile).subarray(this.#logFrom).toString())

  #failure(what) {
    const { name, loud, logFile } = this.plan
    const words = loud ? '' : ` Its last words (${logFile}):\n${this.#said().trim().split('\n').slice(-12).join('\n')}`
    return new Trouble(`The ${name} ${what}.${words}`)
  }
}
