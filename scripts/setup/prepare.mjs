import { existsSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { installPackages, missingPackages } from './debian.mjs'
import { installModules, modulesAreStale } from './node-modules.mjs'
import { killCluster, startCluster, stopCluster, watchCluster } from './postgres.mjs'
import { mustRun } from './run.mjs'
import { secretsIn } from './secrets.mjs'
import { environmentFor } from './settings.mjs'
import { build, buildIsStale } from './sources.mjs'

/** Debian packages and node_modules, each only where missing or stale. */
export async function prepareMachine(house, { root, owns, demo }, extraPackages = []) {
  const wanted = [
    'ffmpeg',
    'bubblewrap',
    ...(owns.database ? ['postgresql'] : []),
    ...(demo ? ['flite'] : []),
    ...extraPackages,
  ]
  const missing = missingPackages(wanted)
  if (missing.length > 0)
    await house.step(`Installing Debian packages: ${missing.join(', ')}`, (say) => installPackages(missing, say))
  if (modulesAreStale(root)) await house.step('Installing node_modules (npm ci)', (say) => installModules(root, say))
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

/** The database is there. @returns the environment for every part of the product */
export async function prepareDatabase(house, settings, from) {
  const url = await openDatabase(house, settings, from)
  return environmentFor(settings, from, url, secretsIn(settings.dataDir))
}

/** Migrations, queues and the shipped handbook; run on every start, for a restored database may be an older one. */
export const prepareSchema = (house, { root }, env) =>
  house.step('Bringing the database up to date', async (say) => {
    await runScript(root, env, 'scripts/migrate.ts', say)
    await runScript(root, env, 'scripts/load-handbook.ts', say)
  })

/** The demo, once: the note is written last, so a seeding that was cut off is run again. */
export async function prepareDemo(house, { root, dataDir, demo }, env) {
  const note = path.join(dataDir, 'demo.json')
  if (!demo || existsSync(note)) return
  await house.step('Filling in the demo (first start only)', (say) => runScript(root, env, 'scripts/seed.ts', say))
  writeFileSync(note, JSON.stringify({ seededAt: new Date().toISOString() }))
}

/** The pages, built again only where their sources changed. */
export async function prepareBuild(house, { root, distDir }, env) {
  if (buildIsStale(root, distDir)) await house.step('Building the pages', (say) => build(root, distDir, env, say))
}
