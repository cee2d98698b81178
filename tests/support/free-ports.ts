import { once } from 'node:events'
import { createServer, type AddressInfo } from 'node:net'

/** Ports on loopback that nobody holds at this moment, all different. */
export async function freePorts(count: number): Promise<number[]> {
  const servers = await Promise.all(
    Array.from({ length: count }, async () => {
      const server = createServer().listen(0, '127.0.0.1')
      await once(server, 'listening')
      return server
    }),
  )
  const ports = servers.map((server) => (server.address() as AddressInfo).port)
  await Promise.all(servers.map((server) => new Promise((closed) => server.close(closed))))
  return ports
}
