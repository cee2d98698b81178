import { db } from '@/lib/db'
import { env } from '@/lib/env'
import { prepareQueue } from '@/lib/jobs/queue'
import { registry } from '@/lib/jobs/registry'
import { migrateDown, migrateUp, pendingMigrations } from '../migrations/migrator'

const said = process.argv[2] ?? 'up'

async function main(): Promise<void> {
  if (said === 'up') {
    const names = await migrateUp(db())
    await prepareQueue(
      env().DATABASE_URL,
      registry.map(({ job }) => job),
    )
    console.log(names.length > 0 ? `Migrated: ${names.join(', ')}` : 'The database is up to date.')
  } else if (said === 'down') console.log(`Taken back: ${(await migrateDown(db())).join(', ')}`)
  else if (said === 'pending') console.log((await pendingMigrations(db())).join('\n'))
  else throw new Error('migrate up | down | pending')
  await db().close()
}

main().catch((failure: unknown) => {
  console.error(failure instanceof Error ? failure.message : failure)
  process.exit(1)
})
