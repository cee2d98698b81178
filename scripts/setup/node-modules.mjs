import { readFileSync, statSync } from 'node:fs'
import path from 'node:path'
import { mustRun } from './run.mjs'

const changedAt = (file) => statSync(file, { throwIfNoEntry: false })?.mtimeMs ?? 0

/** True where node_modules is missing, half made (npm writes its note last) or older than the lock file. */
export const modulesAreStale = (root) =>
  changedAt(path.join(root, 'node_modules/.package-lock.json')) < changedAt(path.join(root, 'package-lock.json'))

/** Turns npm's lines on what it asked for into "310 of about 1840 downloads": first each package's page, then the package. */
function fetchedSoFar(root, say) {
  const { packages } = JSON.parse(readFileSync(path.join(root, 'package-lock.json'), 'utf8'))
  const all = 2 * (Object.keys(packages).length - 1)
  let fetched = 0
  return (text) => {
    fetched += text.match(/^npm http (fetch|cache) /gm)?.length ?? 0
    if (fetched > 0) say(`${Math.min(fetched, all)} of about ${all} downloads`)
  }
}

/** Installs exactly what the lock file says; the build tools too, whatever NODE_ENV says. */
export async function installModules(root, say) {
  const flags = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=http']
  await mustRun('npm', flags, { cwd: root, onText: fetchedSoFar(root, say) })
}
