import { db } from '@/lib/db'
import { rebuildSearch } from '@/lib/search/rebuild-search'

async function main(): Promise<void> {
  const count = await rebuildSearch()
  console.log(`The search index was made anew: ${count} documents.`)
}

main()
  .catch((failure: unknown) => {
    console.error(failure instanceof Error ? failure.message : failure)
    process.exitCode = 1
  })
  .finally(() => db().close())
