import { spawn } from 'node:child_process'

/**
 * Runs a program to its end and collects what it said.
 * `stdio` may replace the pipes; then `stdout` and `stderr` stay empty. Never rejects for a non-zero status.
 * A session of its own keeps Ctrl-C away from the child: who started it decides when it ends.
 */
export function run(command, args, { env = process.env, cwd = '/', stdio = ['ignore', 'pipe', 'pipe'], onLine } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd, env, stdio, detached: true })
    const said = { stdout: '', stderr: '' }
    for (const name of ['stdout', 'stderr']) {
      child[name]?.setEncoding('utf8').on('data', (text) => {
        said[name] += text
        onLine?.(text)
      })
    }
    child.once('error', reject)
    child.once('close', (code, signal) => resolve({ status: code ?? 1, signal, ...said }))
  })
}

/** Like `run`, but a non-zero status throws with the last words of the program. */
export async function mustRun(command, args, options) {
  const ended = await run(command, args, options)
  if (ended.status === 0) return ended
  const words = `${ended.stdout}\n${ended.stderr}`.trim().split('\n').slice(-12).join('\n')
  throw new Error(`${command} ${args[0] ?? ''} ended with ${ended.signal ?? ended.status}:\n${words}`)
}
