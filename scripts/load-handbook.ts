import { db } from '@/lib/db'
import { loadHandbook } from '@/lib/handbook/load-handbook'

async function main(): Promise<void> {
  const { terms, explainers } = await loadHandbook()
  console.log(
    terms + explainers > 0 ? `The handbook: ${terms} terms, ${explainers} explainers.` : 'The handbook is up to date.',
  )
}

main()
  .catch((failure: unknown) => {
    console.error(failure instanceof Error ? failure.message : failure)
    process.exitCode = 1
  })
  .finally(() => db().close())
