import { randomInt } from 'node:crypto'
import { once } from 'node:events'
import { createServer, type Server } from 'node:net'

/** Below where Linux takes ports for outgoing connections (32768 up): one that is free now is not taken by chance. */
const [FIRST, LAST] = [20_000, 32_000]

async function listenSomewhere(): Promise<{ server: Server; port: number }> {
  for (let left = 50; ; left--) {
    const port = randomInt(FIRST, LAST)
    const server = createServer().listen(port, '127.0.0.1')
    try {
      await once(server, 'listening')
      return { server, port }
    } catch (failure) {
      if (left === 0) throw failure
    }
  }
}

/** Ports on loopback that nobody holds at this moment, all different. */
export async function freePorts(count: number): Promise<number[]> {
  const taken = await Promise.all(Array.from({ length: count }, listenSomewhere))
  await Promise.all(taken.map(({ server }) => new Promise((closed) => server.close(closed))))
  return taken.map(({ port }) => port)
}
