import path from 'node:path'
import { playwrightCounts, stepCounts, vitestCounts } from './test-counts.mjs'
import { run } from './run.mjs'

const bin = (root, file) => path.join(root, 'node_modules', file)

/** Runs a tool of node_modules with its words on the terminal. @returns its status */
const tool = async ({ root, env }, file, args, more = {}) =>
  (await run(process.execPath, [bin(root, file), ...args], { cwd: root, env: { ...env, ...more }, stdio: 'inherit' }))
    .status

const checked = async (status) => stepCounts((await status) === 0)

async function types(bench) {
  const generated = await tool(bench, 'next/dist/bin/next', ['typegen'])
  if (generated !== 0) return stepCounts(false)
  return checked(tool(bench, 'typescript/bin/tsc', ['--noEmit', '-p', 'scripts/setup/tsconfig.check.json']))
}

async function vitest(bench, project) {
  const report = path.join(bench.folder, `${project}.json`)
  const flags = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const settings = { NODE_ENV: 'test', LOG_LEVEL: 'silent' }
  return vitestCounts(report, await tool(bench, 'vitest/vitest.mjs', ['run', '--project', project, ...flags], settings))
}

async function e2e(bench) {
  const report = path.join(bench.folder, 'e2e.json')
  const settings = { PLAYWRIGHT_JSON_OUTPUT_FILE: report, FORCE_COLOR: '0' }
  return playwrightCounts(
    report,
    await tool(bench, '@playwright/test/cli.js', ['test', '--reporter=list,json'], settings),
  )
}

/**
 * The parts of `npm test` in their order. `needs` says what must be there first: a database, the built pages, the whole product, a browser.
 * `run` gets the bench { root, env, folder } and returns { passed, failed }.
 */
export const parts = [
  {
    name: 'format',
    run: (bench) => checked(tool(bench, 'prettier/bin/prettier.cjs', ['--check', '--log-level=warn', '.'])),
  },
  { name: 'lint', run: (bench) => checked(tool(bench, 'eslint/bin/eslint.js', ['.', '--max-warnings=0'])) },
  { name: 'types', run: types },
  { name: 'unit', run: (bench) => vitest(bench, 'unit') },
  { name: 'service', needs: ['database'], run: (bench) => vitest(bench, 'service') },
  { name: 'media', run: (bench) => vitest(bench, 'media') },
  { name: 'build', needs: ['build'], run: () => stepCounts(true) },
  { name: 'e2e', needs: ['database', 'build', 'product', 'browser'], run: e2e },
]
