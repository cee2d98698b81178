import { once } from 'node:events'
import { searchServer } from './server'
import { openStore } from './store'
import { openTasks } from './tasks'

/**
 * A stand-in for the search service on 127.0.0.1: the documented HTTP API as far as the product uses it. Indexes and
 * accepted tasks are kept in `directory` over restarts. With `key`, every call but /health needs it as a Bearer token.
 */
export async function startSearchFake(where: {
  port: number
  directory: string
  key?: string
}): Promise<{ stop: () => Promise<void> }> {
  const store = openStore(where.directory)
  const tasks = openTasks(store)
  const server = searchServer({ store, tasks, key: where.key })
  server.listen(where.port, '127.0.0.1')
  await once(server, 'listening')
  return {
    async stop() {
      const closed = once(server, 'close')
      server.close()
      server.closeAllConnections()
      await Promise.all([closed, tasks.idle()])
    },
  }
}
