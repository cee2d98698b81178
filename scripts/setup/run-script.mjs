import { spawn } from 'node:child_process'
import path from 'node:path'
import { clusterUrl } from './postgres.mjs'
import { secretsIn } from './secrets.mjs'
import { environmentFor, loadEnvFile, root, settingsFrom } from './settings.mjs'
import { sentenceFor, Trouble } from './trouble.mjs'

/** Runs one of the project's TypeScript scripts by hand, with the settings and the database that `npm start` uses. */
export async function main([file, ...args]) {
  try {
    if (!file) throw new Trouble('Say which script: node scripts/run.mjs scripts/reindex.ts')
    loadEnvFile()
    const settings = settingsFrom(process.env)
    const { databasePort: port, dataDir, owns } = settings
    const url = owns.database
      ? clusterUrl({ directory: path.join(dataDir, 'postgres'), port })
      : process.env.DATABASE_URL
    // Not marked as part of the running product: the next start must not end it as a leftover.
    const env = environmentFor(settings, process.env, url, secretsIn(dataDir))
    delete env.TURNROW_HOME
    const child = spawn(process.execPath, ['--import', 'tsx', path.resolve(file), ...args], {
      cwd: root,
      env,
      stdio: 'inherit',
    })
    for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal))
    child.once('exit', (code) => process.exit(code ?? 1))
  } catch (error) {
    console.error(sentenceFor(error))
    process.exitCode = 1
  }
}
