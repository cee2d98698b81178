import { randomInt } from 'node:crypto'
import { createServer } from 'node:net'
import { Trouble } from './trouble.mjs'

/** Tries to listen and lets go again. Resolves to the port, rejects with the system's error. */
export function tryPort(port, host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const server = createServer()
    server.once('error', reject)
    server.listen({ port, host, exclusive: true }, () => {
      server.close(() => resolve(port))
    })
  })
}

/**
 * A port nobody listens on just now. Below where Linux takes ports for outgoing connections (32768 up),
 * so that it is not given away between this look and the listening.
 */
export async function freePort() {
  for (let left = 50; ; left -= 1) {
    try {
      return await tryPort(randomInt(20_000, 32_000))
    } catch (error) {
      if (left === 0) throw error
    }
  }
}

/** Throws a sentence that names the setting where the port cannot be had. */
export async function mustBeFree(port, { host = '127.0.0.1', what, setting }) {
  await tryPort(port, host).catch((error) => {
    if (error.code === 'EADDRINUSE')
      throw new Trouble(
        `Port ${port} for ${what} is in use by another program; end it or set ${setting} to a free port.`,
      )
    if (error.code === 'EACCES')
      throw new Trouble(`Port ${port} for ${what} needs root; set ${setting} to one above 1023.`)
    if (error.code === 'EADDRNOTAVAIL')
      throw new Trouble(`This machine has no address ${host} for ${what}; check HOST.`)
    throw error
  })
}
