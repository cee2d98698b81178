import { House, Stopped } from './house.mjs'
import { sweepLeftovers } from './leftovers.mjs'
import { lockFolder } from './lock.mjs'
import { mustHaveRoom, portsMustBeFree } from './preflight.mjs'
import { prepareBuild, prepareDatabase, prepareDemo, prepareMachine, prepareSchema } from './prepare.mjs'
import { serversFor } from './servers.mjs'
import { loadEnvFile, settingsFrom } from './settings.mjs'
import { firstSignal } from './signals.mjs'
import { together } from './together.mjs'
import { sentenceFor } from './trouble.mjs'
import { welcome } from './welcome.mjs'

/** Prepares whatever is missing, then starts every server. `mode` is start or dev; dev builds nothing beforehand. */
async function bringUp(house, settings, mode) {
  const since = performance.now()
  await portsMustBeFree(settings)
  await prepareMachine(house, settings)
  const env = await prepareDatabase(house, settings, process.env)
  const start = (server) => () =>
    house.step(`Starting the ${server.name}`, () => house.startServer(server, { root: settings.root, env }))
  const { standIns, worker, web } = serversFor({ ...settings, mode })
  await together(() => prepareSchema(house, settings, env), ...standIns.map(start))
  if (mode === 'start') await prepareBuild(house, settings, env)
  // The demo writes letters and search entries, and the worker would take up its films before they are whole.
  await prepareDemo(house, settings, env)
  await together(start(worker), start(web))
  console.log(welcome(settings, ((performance.now() - since) / 1000).toFixed(1)))
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
