import { mustBeRecent } from './setup/node-version.mjs'

mustBeRecent()
import('./setup/bring-up.mjs').then(({ main }) => main('dev'))
