import { mustBeRecent } from './setup/node-version.mjs'

// The rest is loaded only afterwards: an old Node would stumble over its syntax before it could say why.
mustBeRecent()
import('./setup/bring-up.mjs').then(({ main }) => main('start'))
