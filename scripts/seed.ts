import { db } from '@/lib/db'
import { seedDemo } from '@/lib/demo/seed-demo'
import { demoPassword, people } from '@/lib/demo/story/people'

async function main(): Promise<void> {
  const isNew = await seedDemo((line) => console.log(line))
  console.log(isNew ? 'The demo is in. The worker draws its films from here.' : 'The demo is in already.')
  const signIns = people.filter((person) => person.signsIn).map(({ email }) => email)
  console.log(`Sign-ins, password ${demoPassword}: ${signIns.join(', ')}`)
}

main()
  .catch((failure: unknown) => {
    console.error(failure instanceof Error ? failure.message : failure)
    process.exitCode = 1
  })
  .finally(() => db().close())
