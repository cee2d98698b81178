import { rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import { endRunning } from './run.mjs'
import { step } from './steps.mjs'
import { supervise } from './supervise.mjs'

const wholeEndSeconds = 75

/** Thrown where a step would begin after the word to stop was given. */
export class Stopped extends Error {}

/**
 * Everything one start has begun, so that it can be ended in order: last begun, first ended.
 * `pids.json` in the data folder names the servers' processes for those who look after the machine.
 */
export function openHouse(dataDir) {
  const ends = []
  const pids = {}
  const house = { stopping: false }

  house.step = (title, work) => {
    if (house.stopping) throw new Stopped()
    return step(title, work)
  }

  /** Registers what must be undone. `end` is the orderly way, `kill` the way for somebody who will not wait. */
  house.keep = ({ name, end, kill = () => {} }) => ends.push({ name, end, kill })

  house.startServer = async ({ name, args, nodeEnv, loud, isReady, readySeconds, stopSeconds }, { root, env }) => {
    const onPid = (pid) => {
      pids[name] = pid
      writeFileSync(path.join(dataDir, 'pids.json'), JSON.stringify(pids))
    }
    const logFile = path.join(dataDir, 'logs', `${name.replaceAll(' ', '-')}.log`)
    const options = { args, cwd: root, env: { ...env, NODE_ENV: nodeEnv }, logFile, loud, isReady, readySeconds, onPid }
    const server = supervise({ name, ...options })
    house.keep({ name, end: () => server.stop(stopSeconds), kill: server.kill })
    await server.start()
  }

  house.killAll = () => {
    endRunning({ force: true })
    for (const { kill } of ends) kill()
  }

  /** Ends everything in order. Where that takes too long the rest is killed. @returns true for an orderly end */
  house.close = async () => {
    house.stopping = true
    const orderly = (async () => {
      for (const { end } of ends.reverse()) await end()
      return true
    })()
    const ended = await Promise.race([orderly, sleep(wholeEndSeconds * 1000, false, { ref: false })])
    if (!ended) house.killAll()
    rmSync(path.join(dataDir, 'pids.json'), { force: true })
    return ended
  }
  return house
}
