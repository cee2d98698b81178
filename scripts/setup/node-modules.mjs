import { statSync } from 'node:fs'
import path from 'node:path'
import { mustRun } from './run.mjs'

const changedAt = (file) => statSync(file, { throwIfNoEntry: false })?.mtimeMs ?? 0

/** True where node_modules is missing, half made (npm writes its note last) or older than the lock file. */
export const modulesAreStale = (root) =>
  changedAt(path.join(root, 'node_modules/.package-lock.json')) < changedAt(path.join(root, 'package-lock.json'))

/** Installs exactly what the lock file says; the build tools too, whatever NODE_ENV says. */
export async function installModules(root, say) {
  const flags = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=http']
  await mustRun('npm', flags, { cwd: root, onText: say })
}
