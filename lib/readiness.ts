import { randomUUID } from 'node:crypto'
import { createConnection } from 'node:net'
import { db } from './db'
import { env } from './env'
import { services } from './services'

type State = 'ok' | 'failing'

const within = async (milliseconds: number, work: Promise<unknown>): Promise<State> => {
  let timer: NodeJS.Timeout | undefined
  const late = new Promise<State>((resolve) => {
    timer = setTimeout(() => resolve('failing'), milliseconds)
  })
  const done = work.then((): State => 'ok').catch((): State => 'failing')
  return Promise.race([done, late]).finally(() => clearTimeout(timer))
}

const answers = (url: URL) =>
  new Promise<void>((resolve, reject) => {
    const socket = createConnection({ host: url.hostname, port: Number(url.port || 25) }, () => {
      socket.end()
      resolve()
    })
    socket.on('error', reject)
  })

async function writes(): Promise<void> {
  const name = `probes/${randomUUID()}`
  await services().storage.put(name, new Uint8Array([1]))
  await services().storage.remove(name)
}

/**
 * Whether this copy can do its work. Without mail or search it still can: letters wait in the outbox, and the search
 * page says that it is limited.
 */
export async function readiness() {
  const [database, queue, storage, search, mail] = await Promise.all([
    within(3_000, db().query('select 1 from migrations limit 1')),
    within(3_000, db().query('select 1 from pgboss.version')),
    within(3_000, writes()),
    within(3_000, services().search.health()),
    within(3_000, answers(new URL(env().SMTP_URL))),
  ])
  const ready = database === 'ok' && queue === 'ok' && storage === 'ok'
  return { ready, database, queue, storage, search, mail }
}
