import { startSearchFake } from './start'

const port = Number(process.env.SEARCH_PORT ?? 7700)
const directory = process.env.SEARCH_DIR ?? '.data/search'

startSearchFake({ port, directory, key: process.env.SEARCH_KEY }).then(
  ({ stop }) => {
    console.log(`search: on http://127.0.0.1:${port}`)
    for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => void stop())
  },
  (error: Error) => {
    console.error(`search: could not start: ${error.message}`)
    process.exitCode = 1
  },
)
