import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'

const names = ['NEXTAUTH_SECRET', 'MEDIA_SECRET', 'SEARCH_KEY']

/** Secrets of this installation, made once and kept in the data folder for its owner alone. A name that is new is added. */
export function secretsIn(dataDir) {
  const file = path.join(dataDir, 'secrets.json')
  const known = existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : {}
  const missing = names.filter((name) => !known[name])
  if (missing.length === 0) return known
  for (const name of missing) known[name] = randomBytes(32).toString('base64url')
  mkdirSync(dataDir, { recursive: true })
  writeFileSync(file, `${JSON.stringify(known, null, 2)}\n`, { mode: 0o600 })
  return known
}
