import { spawn } from 'node:child_process'
import { Trouble } from './trouble.mjs'

const running = new Map()
const patience = 10_000

/**
 * Runs a program to its end and collects what it said.
 * `stdio` may replace the pipes; then `stdout` and `stderr` stay empty. Never rejects for a non-zero status.
 * A session of its own keeps Ctrl-C away from the child: `endRunning` decides when it ends.
 * `toTheEnd` marks work that must not be cut (a package half unpacked).
 */
export function run(command, args, options = {}) {
  const { env = process.env, cwd = '/', stdio = ['ignore', 'pipe', 'pipe'], onText, toTheEnd = false } = options
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, stdio, detached: true })
    running.set(child, toTheEnd)
    const said = { stdout: '', stderr: '' }
    for (const name of ['stdout', 'stderr']) {
      child[name]?.setEncoding('utf8').on('data', (text) => {
        said[name] += text
        onText?.(text)
      })
    }
    child.once('error', (error) => {
      running.delete(child)
      reject(error)
    })
    child.once('close', (code, signal) => {
      running.delete(child)
      resolve({ status: code ?? 1, signal, ...said })
    })
  })
}

/** Like `run`, but a non-zero status throws with the last words of the program; a full disk gets its own sentence. */
export async function mustRun(command, args, options) {
  const ended = await run(command, args, options)
  if (ended.status === 0) return ended
  const said = `${ended.stdout}\n${ended.stderr}`.trim()
  if (/ENOSPC|no space left on device/i.test(said)) throw new Trouble('The disk is full. Make room and start again.')
  const words = said.split('\n').slice(-15).join('\n')
  throw new Trouble(`${command} ${args.slice(0, 3).join(' ')} ended with ${ended.signal ?? ended.status}:\n${words}`)
}

/**
 * Asks every program that still runs to end, group by group, and kills after a while what takes too long over it
 * (npm first takes back what it had unpacked). What must not be cut is waited for, unless forced.
 */
export function endRunning({ force = false } = {}) {
  for (const [child, toTheEnd] of running) {
    if (toTheEnd && !force) console.log('  waiting for the package installation, which must not be cut …')
    else if (force) endGroup(child.pid, 'SIGKILL')
    else {
      endGroup(child.pid, 'SIGTERM')
      setTimeout(() => running.has(child) && endGroup(child.pid, 'SIGKILL'), patience).unref()
    }
  }
}

/** Signals a process and everything it started. Silent where nothing is left. */
export function endGroup(pid, signal) {
  try {
    process.kill(-pid, signal)
  } catch {
    // Already gone.
  }
}
