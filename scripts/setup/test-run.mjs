import { waitForFilms } from './films.mjs'
import { House, Stopped } from './house.mjs'
import { lockFolder } from './lock.mjs'
import { mustHaveRoom } from './preflight.mjs'
import { prepare, prepareBuild } from './prepare.mjs'
import { startProduct } from './product.mjs'
import { root } from './settings.mjs'
import { firstSignal } from './signals.mjs'
import { clearBench, clearDeadBenches, makeBench, testEnvironment } from './test-bench.mjs'
import { closingLine, stepCounts, sumOf } from './test-counts.mjs'
import { parts } from './test-parts.mjs'
import { sentenceFor, Trouble } from './trouble.mjs'

/** The parts asked for by name; none named means all. Throws Trouble for a name that is none. */
export function chooseParts(names) {
  const unknown = names.find((name) => !parts.some((part) => part.name === name))
  if (unknown)
    throw new Trouble(`There is no part "${unknown}"; there are ${parts.map((part) => part.name).join(', ')}.`)
  return names.length === 0 ? parts : parts.filter((part) => names.includes(part.name))
}

async function startWithFilms(house, { settings, env }) {
  await startProduct(house, settings, env, 'start')
  await house.step('Waiting for the films of the demo', (say) => waitForFilms(house, settings.baseUrl, say))
}

/** One part with all it needs. Whatever keeps it from running is its failure, said in a sentence. */
async function runPart(house, bench, part, ready) {
  console.log(`\n— ${part.name} —`)
  try {
    if (part.needs?.includes('build')) await prepareBuild(house, bench.settings, bench.outside)
    if (part.needs?.includes('product')) ready.product ??= startWithFilms(house, bench)
    await ready.product
    if (house.stopping) throw new Stopped()
    return await part.run(bench)
  } catch (error) {
    if (!(error instanceof Stopped)) console.error(`${part.name} could not run: ${sentenceFor(error)}`)
    return stepCounts(false)
  }
}

async function runAll(house, bench, chosen) {
  const needs = new Set(chosen.flatMap((part) => part.needs ?? []))
  const env = await prepare(house, bench.settings, bench.outside, {
    wantsBuild: false,
    wantsDatabase: needs.has('database'),
    packages: needs.has('browser') ? ['chromium'] : [],
  })
  bench.env = testEnvironment(bench, env)
  const [counts, ready] = [[], {}]
  for (const part of chosen) {
    counts.push(await runPart(house, bench, part, ready))
    console.log(`${part.name}: ${closingLine(counts.at(-1))}`)
  }
  return sumOf(counts)
}

/** `npm test`: everything it needs, every part, everything cleared away, and one closing line. */
export async function main(names) {
  let [bench, house, sum] = [null, null, stepCounts(false)]
  try {
    const chosen = chooseParts(names)
    await lockFolder(root, 'its tests')
    await clearDeadBenches()
    bench = await makeBench(root, process.env)
    mustHaveRoom(bench.settings)
    house = new House(bench.settings.dataDir)
    void firstSignal(house)
    sum = await runAll(house, bench, chosen)
  } catch (error) {
    if (!(error instanceof Stopped)) console.error(sentenceFor(error))
  }
  await house?.close()
  if (bench) await clearBench(bench.folder)
  console.log(`\n${closingLine(sum)}`)
  process.exit(sum.failed > 0 || sum.passed === 0 ? 1 : 0)
}
