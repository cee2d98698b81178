import { Meilisearch } from 'meilisearch'
import { diskStorage } from '@/media/disk'
import { env } from './env'

const build = () => ({
  /** Films, stills and footage as filmed. */
  storage: diskStorage(env().MEDIA_ROOT),
  search: new Meilisearch({ host: env().SEARCH_URL, apiKey: env().SEARCH_KEY, timeout: 5_000 }),
})

let built: ReturnType<typeof build> | undefined

/** The outside world, chosen by settings alone. Mail goes through the outbox (lib/mail). */
export const services = () => (built ??= build())
