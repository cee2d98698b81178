import { prepareDemo, prepareHandbook, prepareSchema } from './prepare.mjs'
import { serversFor } from './servers.mjs'
import { together } from './together.mjs'

/**
 * Starts the whole product on a database that is there: schema, stand-ins, demo, worker, web. `mode` is start or dev.
 * @returns whether the demo was filled in just now, so that its films are still to come
 */
export async function startProduct(house, settings, env, mode) {
  const start = (server) => () =>
    house.step(`Starting the ${server.name}`, () => house.startServer(server, { root: settings.root, env }))
  const { standIns, worker, web } = serversFor({ ...settings, mode })
  await together(() => prepareSchema(house, settings, env), ...standIns.map(start))
  // Before the worker: it would take up films of a demo that is still being written.
  const isNew = await prepareDemo(house, settings, env)
  await together(start(worker), start(web), () => prepareHandbook(house, settings, env))
  return { isNew }
}
