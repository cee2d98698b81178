import { mustBeInstallable } from './debian.mjs'
import { House, Stopped } from './house.mjs'
import { sweepLeftovers } from './leftovers.mjs'
import { lockFolder } from './lock.mjs'
import { mustHaveRoom, portsMustBeFree } from './preflight.mjs'
import { lackingPackages, prepare } from './prepare.mjs'
import { startProduct } from './product.mjs'
import { loadEnvFile, settingsFrom } from './settings.mjs'
import { firstSignal } from './signals.mjs'
import { sentenceFor } from './trouble.mjs'
import { welcome } from './welcome.mjs'

/** Prepares whatever is missing, then starts every server. Dev builds nothing beforehand. */
async function bringUp(house, settings, mode) {
  const since = performance.now()
  await portsMustBeFree(settings)
  await mustBeInstallable(lackingPackages(settings))
  const env = await prepare(house, settings, process.env, { wantsBuild: mode === 'start' })
  const { isNew } = await startProduct(house, settings, env, mode)
  console.log(welcome({ ...settings, isNew }, ((performance.now() - since) / 1000).toFixed(1)))
}

/** One start from the first look to the last process ended. Sets the exit code; never rejects. */
export async function main(mode) {
  let house
  try {
    loadEnvFile()
    const settings = settingsFrom(process.env)
    mustHaveRoom(settings)
    await lockFolder(settings.dataDir, settings.baseUrl)
    if ((await sweepLeftovers(settings.dataDir)) > 0) console.log('· Ended what an earlier start had left running')
    house = new House(settings.dataDir)
    const signal = firstSignal(house)
    await bringUp(house, settings, mode)
    await signal
  } catch (error) {
    if (!(error instanceof Stopped) && !house?.stopping) {
      console.error(`\n${sentenceFor(error)}`)
      process.exitCode = 1
    }
  }
  if (house && !(await house.close())) process.exitCode = 1
  if (house?.stopping && !process.exitCode) console.log('Stopped.')
  process.exit()
}
