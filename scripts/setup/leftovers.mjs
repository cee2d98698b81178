import { readdirSync, readFileSync } from 'node:fs'
import { setTimeout as sleep } from 'node:timers/promises'

/** Processes that carry our mark in their environment. Others' environments cannot be read and are not ours. */
function marked(home) {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && Number(name) !== process.pid)
    .filter((pid) => {
      try {
        return readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0').includes(`TURNROW_HOME=${home}`)
      } catch {
        return false
      }
    })
    .map(Number)
}

const signal = (pids, name) => {
  for (const pid of pids) {
    try {
      process.kill(pid, name)
    } catch {
      // Gone between the look and the word.
    }
  }
}

/**
 * Ends what an earlier start left behind when it was killed itself: servers on our ports, an ffmpeg still writing.
 * Call it only while holding the folder's lock. @returns how many there were
 */
export async function sweepLeftovers(home) {
  const found = marked(home)
  if (found.length === 0) return 0
  signal(found, 'SIGTERM')
  for (let waited = 0; waited < 50 && marked(home).length > 0; waited += 1) await sleep(100)
  signal(marked(home), 'SIGKILL')
  for (let waited = 0; waited < 50 && marked(home).length > 0; waited += 1) await sleep(100)
  return found.length
}
