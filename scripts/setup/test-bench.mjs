import { chmodSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { freePort } from './ports.mjs'
import { stopCluster } from './postgres.mjs'
import { sweepLeftovers } from './leftovers.mjs'
import { settingsFrom } from './settings.mjs'

const prefix = 'turnrow-test-'

/** Clears away what test runs left whose process is gone (kill -9): their servers, their clusters, their folders. */
export async function clearDeadBenches() {
  for (const name of readdirSync(tmpdir()).filter((entry) => entry.startsWith(prefix))) {
    const [pid] = name.slice(prefix.length).split('-')
    const folder = path.join(tmpdir(), name)
    if (!existsSync(`/proc/${pid}`)) await clearBench(folder)
  }
}

/** Ends whatever still runs from a bench's folder and removes it. */
export async function clearBench(folder) {
  const dataDir = path.join(folder, 'data')
  await sweepLeftovers(dataDir)
  if (existsSync(path.join(dataDir, 'postgres'))) await stopCluster({ directory: path.join(dataDir, 'postgres') })
  rmSync(folder, { recursive: true, force: true })
}

// Settings of a real installation have no place here: a test must never write to its database or send its letters.
const foreign = [
  'DATABASE_URL',
  'SMTP_URL',
  'SEARCH_URL',
  'SEARCH_KEY',
  'MEDIA_ROOT',
  'BASE_URL',
  'HOST',
  'DATA_DIR',
  'DEMO',
  'MAIL_FROM',
]

async function portsFor(names) {
  const ports = new Set()
  while (ports.size < names.length) ports.add(String(await freePort()))
  return Object.fromEntries(names.map((name, index) => [name, [...ports][index]]))
}

/** A temporary folder, free ports and settings that touch nothing of an installation in the same place. */
export async function makeBench(root, from) {
  const folder = mkdtempSync(path.join(tmpdir(), `${prefix}${process.pid}-`))
  // The postgres user must be able to walk through it to its cluster.
  chmodSync(folder, 0o711)
  const ports = await portsFor(['PORT', 'DATABASE_PORT', 'MAIL_SMTP_PORT', 'MAIL_PAGE_PORT', 'SEARCH_PORT'])
  const own = Object.fromEntries(Object.entries(from).filter(([name]) => !foreign.includes(name)))
  const outside = { ...own, ...ports, DATA_DIR: path.join(folder, 'data'), NEXT_DIST_DIR: '.next-test' }
  mkdirSync(outside.DATA_DIR)
  return { root, folder, outside, settings: { ...settingsFrom(outside, root), durable: false } }
}

/** What tests are told beyond the product's own settings. */
export const testEnvironment = ({ folder, settings }, env) => ({
  ...env,
  ...(env.DATABASE_URL ? { TEST_DATABASE_URL: env.DATABASE_URL } : {}),
  E2E_BASE_URL: settings.baseUrl,
  E2E_MAILBOX_URL: `http://127.0.0.1:${settings.mailPagePort}`,
  E2E_SEARCH_URL: `http://127.0.0.1:${settings.searchPort}`,
  E2E_PIDS_FILE: path.join(folder, 'data', 'pids.json'),
})
