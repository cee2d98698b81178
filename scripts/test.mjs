import { mustBeRecent } from './setup/node-version.mjs'

mustBeRecent()
import('./setup/test-run.mjs').then(({ main }) => main(process.argv.slice(2)))
