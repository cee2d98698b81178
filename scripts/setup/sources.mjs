import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { mustRun } from './run.mjs'

// What can change the built pages: the product's folders, and the files at the top that steer the build.
const folders = ['app', 'components', 'fonts', 'lib', 'media', 'models', 'public']
const steering =
  /^(package-lock\.json|tsconfig\.json|next\.config\.ts|postcss\.config\.mjs|proxy\.ts|instrumentation\.ts|\.env)$/

function filesUnder(folder) {
  if (!existsSync(folder)) return []
  return readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
    const file = path.join(folder, entry.name)
    return entry.isDirectory() ? filesUnder(file) : [file]
  })
}

/** One hash over names and contents of everything the build reads. Times are left out: a checkout changes them all. */
export function sourceHash(root) {
  const top = readdirSync(root).filter((name) => steering.test(name))
  const files = [
    ...top.map((name) => path.join(root, name)),
    ...folders.flatMap((name) => filesUnder(path.join(root, name))),
  ]
  const hash = createHash('sha256')
  for (const file of files.sort()) {
    const content = readFileSync(file)
    hash.update(`${path.relative(root, file)}\0${content.length}\0`).update(content)
  }
  return hash.digest('hex')
}

const noteOf = (root, distDir) => path.join(root, distDir, 'built-from')

/** True where no whole build of just these sources lies in `distDir`. */
export function buildIsStale(root, distDir) {
  const note = noteOf(root, distDir)
  return (
    !existsSync(note) ||
    !existsSync(path.join(root, distDir, 'BUILD_ID')) ||
    readFileSync(note, 'utf8') !== sourceHash(root)
  )
}

/** Builds the pages. The hash is taken before and noted after, so an edit during the build means another build next time. */
export async function build(root, distDir, env, say) {
  const hash = sourceHash(root)
  const next = path.join(root, 'node_modules/next/dist/bin/next')
  await mustRun(process.execPath, [next, 'build'], { cwd: root, env: { ...env, NODE_ENV: 'production' }, onText: say })
  writeFileSync(noteOf(root, distDir), hash)
}
