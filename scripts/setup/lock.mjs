import { statSync } from 'node:fs'
import { connect, createServer } from 'node:net'
import { Trouble } from './trouble.mjs'

/**
 * One start per folder. The lock is a name in the kernel (an abstract socket), not a file:
 * it dies with its process, so kill -9 leaves nothing to clear away.
 * It is keyed by the folder's inode, because two machines in folders of one kernel share these names.
 * Throws one sentence where the folder is taken. @returns a function that lets go
 */
export async function lockFolder(folder, address) {
  const { dev, ino } = statSync(folder)
  const name = `\0turnrow-${dev}-${ino}`
  const server = createServer((caller) =>
    caller.on('error', () => {}).end(JSON.stringify({ pid: process.pid, address })),
  )
  const listening = await new Promise((resolve) => {
    server.once('error', () => resolve(false))
    server.listen(name, () => resolve(true))
  })
  if (!listening) {
    const { pid, address: running } = await holderOf(name)
    throw new Trouble(`Turnrow is already running from this folder (process ${pid}, ${running}); end that one first.`)
  }
  server.unref()
  return () => server.close()
}

function holderOf(name) {
  return new Promise((resolve) => {
    let said = ''
    const nobody = () => resolve({ pid: 'unknown', address: 'address unknown' })
    const caller = connect(name)
    caller.setEncoding('utf8').setTimeout(2000, () => caller.destroy())
    caller.on('data', (text) => (said += text)).on('error', nobody)
    caller.on('close', () => (said ? resolve(JSON.parse(said)) : nobody()))
  })
}
