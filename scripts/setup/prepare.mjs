import { existsSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { installPackages, missingPackages } from './debian.mjs'
import { installModules, modulesAreStale } from './node-modules.mjs'
import { killCluster, startCluster, stopCluster, watchCluster } from './postgres.mjs'
import { mustRun } from './run.mjs'
import { secretsIn } from './secrets.mjs'
import { environmentFor } from './settings.mjs'
import { build, buildIsStale } from './sources.mjs'
import { together } from './together.mjs'

/** The Debian packages that this start needs and that are not here. */
export const lackingPackages = ({ owns, demo }, extra = []) =>
  missingPackages([
    'ffmpeg',
    'bubblewrap',
    ...(owns.database ? ['postgresql'] : []),
    ...(demo ? ['flite'] : []),
    ...extra,
  ])

/** Debian packages, only where some are missing. */
async function preparePackages(house, settings, extra) {
  const missing = lackingPackages(settings, extra)
  if (missing.length > 0)
    await house.step(`Installing Debian packages: ${missing.join(', ')}`, (say) => installPackages(missing, say))
}

/** The database's address: the one that was given, or our own cluster's, which is then kept alive and ended with the house. */
async function openDatabase(house, { dataDir, databasePort, owns, durable = true }, from) {
  if (!owns.database) return from.DATABASE_URL
  const options = { directory: path.join(dataDir, 'postgres'), port: databasePort, durable }
  house.keep({ end: () => stopCluster(options), kill: () => killCluster(options.directory) })
  const { url } = await house.step(`Starting PostgreSQL on port ${databasePort}`, () => startCluster(options))
  const endWatch = watchCluster(options)
  house.keep({ end: endWatch, kill: endWatch })
  return url
}

/** Runs one of the project's TypeScript scripts to its end. */
export const runScript = (root, env, file, say) =>
  mustRun(process.execPath, ['--import', 'tsx', path.join(root, file)], { cwd: root, env, onText: say })

/** node_modules, only where missing or older than the lock file. */
async function prepareModules(house, { root }) {
  if (modulesAreStale(root)) await house.step('Installing node_modules (npm ci)', (say) => installModules(root, say))
}

/**
 * The pages, built again only where their sources changed.
 * A page that asked the database while it is built would show that moment for ever: there it finds none.
 */
export async function prepareBuild(house, settings, from) {
  const { root, distDir, dataDir } = settings
  if (!buildIsStale(root, distDir)) return
  const env = environmentFor(settings, from, 'postgres://nobody@127.0.0.1:9/none', secretsIn(dataDir))
  await house.step('Building the pages', (say) => build(root, distDir, env, say))
}

/**
 * Everything that must be there before a server starts, each only where missing or stale: Debian packages and the database
 * on one side, node_modules and the built pages on the other, side by side because neither needs the other.
 * @returns the environment for every part of the product
 */
export async function prepare(house, settings, from, { wantsBuild, wantsDatabase = true, packages = [] }) {
  const [url] = await together(
    async () => {
      await preparePackages(house, settings, packages)
      return wantsDatabase ? openDatabase(house, settings, from) : undefined
    },
    async () => {
      await prepareModules(house, settings)
      if (wantsBuild) await prepareBuild(house, settings, from)
    },
  )
  return environmentFor(settings, from, url, secretsIn(settings.dataDir))
}

/** Migrations and queues; run on every start, for a restored database may be an older one. */
export const prepareSchema = (house, { root }, env) =>
  house.step('Bringing the database up to date', (say) => runScript(root, env, 'scripts/migrate.ts', say))

/** The handbook as shipped, where it changed; what people wrote stays theirs. */
export const prepareHandbook = (house, { root }, env) =>
  house.step('Bringing the handbook up to date', (say) => runScript(root, env, 'scripts/load-handbook.ts', say))

/**
 * The demo, once. The note is written last, so a seeding that was cut off is run again,
 * and lies with the database, so a new database gets its demo. @returns whether it was filled in just now
 */
export async function prepareDemo(house, { root, dataDir, demo, owns }, env) {
  const note = path.join(dataDir, 'postgres', 'demo.json')
  if (!demo || (owns.database && existsSync(note))) return false
  await house.step('Filling in the demo', (say) => runScript(root, env, 'scripts/seed.ts', say))
  if (owns.database) writeFileSync(note, JSON.stringify({ seededAt: new Date().toISOString() }))
  return true
}
