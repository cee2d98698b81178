import { rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { endRunning } from './run.mjs'
import { step } from './steps.mjs'
import { SupervisedServer } from './supervise.mjs'

const wholeEndSeconds = 75

/** Thrown where a step would begin after the word to stop was given. */
export class Stopped extends Error {}

/**
 * Everything one start has begun, so that it can be ended in order: last begun, first ended.
 * `pids.json` in the data folder names the servers' processes for those who look after the machine.
 */
export class House {
  stopping = false
  #ends = []
  #pids = {}

  constructor(dataDir) {
    this.dataDir = dataDir
  }

  /** Does one announced piece of work; none begins after the word to stop. */
  step(title, work) {
    if (this.stopping) throw new Stopped()
    return step(title, work)
  }

  /** Registers what must be undone. `end` is the orderly way, `kill` the way for somebody who will not wait. */
  keep({ end, kill = () => {} }) {
    this.#ends.push({ end, kill })
  }

  /** Starts a server of servers.mjs and keeps it running until the house closes. */
  async startServer({ nodeEnv, stopSeconds, ...plan }, { root, env }) {
    const server = new SupervisedServer({
      ...plan,
      cwd: root,
      env: { ...env, NODE_ENV: nodeEnv, TURNROW_PROCESS: plan.name },
      logFile: path.join(this.dataDir, 'logs', `${plan.name.replaceAll(' ', '-')}.log`),
      isStopping: () => this.stopping,
      onPid: (pid) => this.#notePid(plan.name, pid),
    })
    this.keep({ end: () => server.stop(stopSeconds), kill: () => server.kill() })
    await server.start()
  }

  /** Ends everything at once and without order. */
  killAll() {
    this.stopping = true
    endRunning({ force: true })
    for (const { kill } of this.#ends) kill()
  }

  /** Ends everything in order. Where that takes too long the rest is killed. @returns true for an orderly end */
  async close() {
    this.stopping = true
    const orderly = async () => {
      for (const { end } of this.#ends.toReversed()) await end()
      return true
    }
    const ended = await Promise.race([orderly(), sleep(wholeEndSeconds * 1000, false, { ref: false })])
    if (!ended) this.killAll()
    rmSync(this.#pidFile(), { force: true })
    return ended
  }

  #pidFile = () => path.join(this.dataDir, 'pids.json')

  #notePid(name, pid) {
    this.#pids[name] = pid
    writeFileSync(this.#pidFile(), JSON.stringify(this.#pids))
  }
}
