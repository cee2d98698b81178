import { accessSync, constants, existsSync, readdirSync } from 'node:fs'
import path from 'node:path'
import { mustRun, run } from './run.mjs'
import { Trouble } from './trouble.mjs'

const folders = () => [...(process.env.PATH ?? '').split(':'), '/usr/bin', '/bin', '/usr/sbin', '/sbin']

const isProgram = (file) => {
  try {
    accessSync(file, constants.X_OK)
    return true
  } catch {
    return false
  }
}

/** True where a program of that name can be called. */
export const hasProgram = (name) => folders().some((folder) => folder && isProgram(path.join(folder, name)))

const hasServer = () =>
  existsSync('/usr/lib/postgresql') &&
  readdirSync('/usr/lib/postgresql').some((version) => isProgram(`/usr/lib/postgresql/${version}/bin/postgres`))

const needs = {
  postgresql: hasServer,
  ffmpeg: () => hasProgram('ffmpeg') && hasProgram('ffprobe'),
  bubblewrap: () => hasProgram('bwrap'),
  flite: () => hasProgram('flite'),
  'espeak-ng': () => hasProgram('espeak-ng'),
  chromium: () => isProgram(process.env.CHROMIUM_PATH || '/usr/bin/chromium'),
}

/** Of these Debian packages, the ones whose programs are not here. */
export const missingPackages = (wanted) => wanted.filter((name) => !needs[name]())

/** How root's work is called: directly, through sudo without a password, or null where neither is possible. */
async function rootPrefix() {
  if (process.getuid() === 0) return []
  if (hasProgram('sudo') && (await run('sudo', ['-n', 'true'])).status === 0) return ['sudo', '-n']
  return null
}

/** How root's work is called here; null where nothing is missing. Throws one sentence where it cannot be called. */
export async function mustBeInstallable(missing) {
  if (missing.length === 0) return null
  const list = missing.join(' ')
  if (!hasProgram('apt-get'))
    throw new Trouble(`These programs are missing and this is no Debian machine to install them on: ${list}.`)
  const prefix = await rootPrefix()
  if (prefix) return prefix
  throw new Trouble(`Debian packages are missing and installing them needs root; run: sudo apt-get install ${list}`)
}

/**
 * Installs what is missing without a question. Never cut short: a package half unpacked blocks every later installation.
 * Throws one sentence where the right or the network is missing.
 */
export async function installPackages(missing, say) {
  const prefix = await mustBeInstallable(missing)
  const asRoot = (command, ...args) => {
    const [first, ...rest] = [...prefix, 'env', 'DEBIAN_FRONTEND=noninteractive', 'LC_ALL=C.UTF-8', command, ...args]
    return mustRun(first, rest, { onText: say, toTheEnd: true })
  }
  // Debian would make and start a cluster of its own on 5432, which nobody here asked for.
  const quiet =
    'f=/etc/postgresql-common/createcluster.conf; [ -e $f ] || { mkdir -p ${f%/*}; echo "create_main_cluster = false" >$f; }'
  if (missing.includes('postgresql')) await asRoot('sh', '-c', quiet)
  await asRoot('dpkg', '--configure', '-a')
  // Someone else may be installing: wait for them instead of failing at once.
  const options = [
    '-y',
    '-o',
    'DPkg::Lock::Timeout=600',
    '-o',
    'Dpkg::Options::=--force-confold',
    '-o',
    'Acquire::Retries=3',
  ]
  await asRoot('apt-get', ...options, 'update')
  await asRoot('apt-get', ...options, 'install', '--no-install-recommends', ...missing)
  const still = missingPackages(missing)
  if (still.length > 0) throw new Trouble(`Debian installed ${still.join(', ')} but the programs are still not here.`)
}
