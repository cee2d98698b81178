import { randomBytes } from 'node:crypto'
import {
  existsSync,
  lstatSync,
  mkdirSync,
  readdirSync,
  readFileSync,
  readlinkSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs'
import path from 'node:path'
import { mustRun, run } from './run.mjs'
import { Trouble } from './trouble.mjs'

const versions = '/usr/lib/postgresql'
const isRoot = () => process.getuid?.() === 0

/** The folder of the server's programs: the cluster's own version where there is one, else the highest installed. */
export function programsFor(data) {
  const installed = existsSync(versions)
    ? readdirSync(versions).filter((version) => existsSync(`${versions}/${version}/bin/postgres`))
    : []
  const highest = installed.sort((a, b) => Number(b) - Number(a))[0]
  if (!highest) throw new Trouble('PostgreSQL is not installed; run: apt-get install postgresql')
  if (!existsSync(`${data}/PG_VERSION`)) return `${versions}/${highest}/bin`
  const made = readFileSync(`${data}/PG_VERSION`, 'utf8').trim()
  if (installed.includes(made)) return `${versions}/${made}/bin`
  throw new Trouble(
    `The database in ${data} was made by PostgreSQL ${made}, which is not installed; run: apt-get install postgresql-${made}`,
  )
}

/** The server refuses to run as root, so root hands its programs to the postgres user. cwd must be one that user may enter. */
export function asServer(command, args, options) {
  const call = isRoot() ? ['runuser', ['-u', 'postgres', '--', command, ...args]] : [command, args]
  return run(...call, { env: { PATH: process.env.PATH, LANG: 'C.UTF-8' }, cwd: '/', ...options })
}

/** Gives a path to the user the server runs as; nothing to do where that is ourselves. */
export const giveToServer = async (...paths) => {
  if (isRoot()) await mustRun('chown', ['postgres:postgres', ...paths])
}

const mayEnter = async (folder) => (await asServer('test', ['-x', folder])).status === 0

/**
 * Where the cluster really lives. A project under a private folder (/root) cannot hold it: the postgres user may not walk there.
 * Then `wanted` becomes a link to a fresh folder under /var/lib/turnrow, so a new clone never meets an old clone's data.
 */
export async function clusterHome(wanted) {
  mkdirSync(path.dirname(wanted), { recursive: true })
  const isLink = lstatSync(wanted, { throwIfNoEntry: false })?.isSymbolicLink() ?? false
  if (isLink) return ownedFolder(readlinkSync(wanted))
  if (await mayEnter(path.dirname(wanted))) return ownedFolder(wanted)
  if (existsSync(path.join(wanted, 'data')))
    throw new Trouble(
      `The postgres user may no longer enter ${path.dirname(wanted)}; open that path for it (chmod o+x) and start again.`,
    )
  const elsewhere = `/var/lib/turnrow/${randomBytes(6).toString('hex')}`
  const home = await ownedFolder(elsewhere)
  symlinkSync(elsewhere, wanted)
  return home
}

/** A folder that was there beforehand (a temporary one) is given over too, as long as no cluster lies in it. */
async function ownedFolder(home) {
  mkdirSync(home, { recursive: true })
  if (!existsSync(path.join(home, 'data'))) await giveToServer(home)
  return home
}

/** Passwords of the cluster's two roles, made once: `admin` owns the server, `app` owns one database and may make more. */
export function clusterPasswords(home) {
  const file = path.join(home, 'passwords.json')
  if (!existsSync(file)) {
    const made = { admin: randomBytes(18).toString('hex'), app: randomBytes(18).toString('hex') }
    writeFileSync(file, JSON.stringify(made), { mode: 0o600 })
  }
  return JSON.parse(readFileSync(file, 'utf8'))
}
