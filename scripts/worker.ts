import { db } from '@/lib/db'
import { env } from '@/lib/env'
import { startWorking } from '@/lib/jobs/work'
import { log } from '@/lib/log'

async function main(): Promise<void> {
  const working = await startWorking(env().DATABASE_URL)
  console.log('Worker is ready.')
  let stopping = false
  const stop = async () => {
    if (stopping) return
    stopping = true
    await working.stop()
    await db().close()
    process.exit(0)
  }
  process.on('SIGTERM', () => void stop())
  process.on('SIGINT', () => void stop())
}

main().catch((failure: unknown) => {
  log.fatal({ err: failure }, 'worker could not start')
  process.exit(1)
})
