import { db } from '@/lib/db'
import { address } from '@/lib/people/schema'
import { makeSiteAdmin } from '@/lib/site/writes'

async function main(): Promise<void> {
  const given = address.safeParse(process.argv[2] ?? '')
  if (!given.success) throw new Error('Give one e-mail address: npm run make-admin -- somebody@farm.example')
  await makeSiteAdmin(given.data)
  await db().close()
  console.log(`${given.data} is a site admin. They sign in with a link by mail.`)
}

main().catch((failure: unknown) => {
  console.error(failure instanceof Error ? failure.message : failure)
  process.exit(1)
})
