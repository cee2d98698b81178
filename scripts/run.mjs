import { mustBeRecent } from './setup/node-version.mjs'

mustBeRecent()
import('./setup/run-script.mjs').then(({ main }) => main(process.argv.slice(2)))
