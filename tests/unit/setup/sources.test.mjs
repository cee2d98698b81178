import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, it } from 'vitest'
import { modulesAreStale } from '../../../scripts/setup/node-modules.mjs'
import { secretsIn } from '../../../scripts/setup/secrets.mjs'
import { buildIsStale, sourceHash } from '../../../scripts/setup/sources.mjs'

let root
beforeEach(() => {
  root = mkdtempSync(path.join(tmpdir(), 'turnrow-sources-'))
  write('app/page.tsx', 'one')
  write('package-lock.json', '{}')
})
afterEach(() => rmSync(root, { recursive: true }))

function write(name, content) {
  mkdirSync(path.dirname(path.join(root, name)), { recursive: true })
  writeFileSync(path.join(root, name), content)
}

it('changes its hash with a content, a name and a new file, but not with a time', () => {
  const seen = new Set([sourceHash(root)])
  utimesSync(path.join(root, 'app/page.tsx'), 1, 1)
  expect(seen).toContain(sourceHash(root))
  const changes = [
    ['app/page.tsx', 'two'],
    ['lib/words.ts', 'one'],
    ['next.config.ts', 'one'],
    ['app/pagetsx', 'two'],
  ]
  for (const [index, [name, content]] of changes.entries()) {
    write(name, content)
    expect(seen.add(sourceHash(root)).size).toBe(index + 2)
  }
})

it('does not care for tests and the outcome of the build itself', () => {
  const before = sourceHash(root)
  write('tests/unit/a.test.ts', 'x')
  write('.next/BUILD_ID', 'x')
  write('README.md', 'x')
  expect(sourceHash(root)).toBe(before)
})

it('keeps two files apart whose joined names and contents are the same', () => {
  write('app/a', 'bc')
  const one = sourceHash(root)
  rmSync(path.join(root, 'app/a'))
  write('app/ab', 'c')
  expect(sourceHash(root)).not.toBe(one)
})

it('calls a build stale that is missing, cut off or of other sources', () => {
  expect(buildIsStale(root, '.next')).toBe(true)
  write('.next/built-from', sourceHash(root))
  expect(buildIsStale(root, '.next')).toBe(true)
  write('.next/BUILD_ID', 'x')
  expect(buildIsStale(root, '.next')).toBe(false)
  write('app/page.tsx', 'two')
  expect(buildIsStale(root, '.next')).toBe(true)
})

it('calls node_modules stale that are missing, half made or older than the lock file', () => {
  expect(modulesAreStale(root)).toBe(true)
  write('node_modules/next/package.json', '{}')
  expect(modulesAreStale(root)).toBe(true)
  write('node_modules/.package-lock.json', '{}')
  utimesSync(path.join(root, 'package-lock.json'), 100, 100)
  expect(modulesAreStale(root)).toBe(false)
  utimesSync(path.join(root, 'node_modules/.package-lock.json'), 50, 50)
  expect(modulesAreStale(root)).toBe(true)
})

it('makes secrets once and keeps them', () => {
  const made = secretsIn(path.join(root, 'data'))
  for (const name of ['NEXTAUTH_SECRET', 'MEDIA_SECRET', 'SEARCH_KEY'])
    expect(made[name].length).toBeGreaterThanOrEqual(32)
  expect(new Set(Object.values(made)).size).toBe(3)
  expect(secretsIn(path.join(root, 'data'))).toEqual(made)
})
