import { QueryTypes } from 'sequelize'
import { db } from '@/lib/db'
import { registry } from '@/lib/jobs/registry'

export type Waiting = { id: string; name: string; data: Record<string, unknown>; singletonKey: string | null }

/** Jobs that wait in the queue, oldest first. */
export const waitingJobs = (name?: string): Promise<Waiting[]> =>
  db().query<Waiting>(
    `select id::text, name, data, singleton_key as "singletonKey" from pgboss.job
     where state = 'created' and ($1::text is null or name = $1) order by created_on, id`,
    { bind: [name ?? null], type: QueryTypes.SELECT },
  )

/** Does the waiting jobs of one name as the worker would, and takes them off the queue. Returns how many there were. */
export async function workOff(name: string): Promise<number> {
  const registered = registry.find(({ job }) => job.name === name)
  if (!registered) throw new Error(`no job is called ${name}`)
  const body = await registered.load()
  const jobs = await waitingJobs(name)
  for (const { id, data } of jobs) {
    await body(data as never)
    await db().query('delete from pgboss.job where id = $1', { bind: [id] })
  }
  return jobs.length
}
