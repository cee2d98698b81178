import path from 'node:path'
import { answersOk, listensOn } from './ready.mjs'

const script = (root, file) => ['--import', 'tsx', path.join(root, file)]

const loopback = new Set(['0.0.0.0', '::', ''])

/** Where the starter itself reaches the web: the address it listens on, or loopback where it listens on all. */
export const healthUrl = ({ host, port }) => {
  const reach = loopback.has(host) ? '127.0.0.1' : host
  return `http://${reach.includes(':') ? `[${reach}]` : reach}:${port}/api/health`
}

function web({ root, host, port, mode }) {
  const next = path.join(root, 'node_modules/next/dist/bin/next')
  const settings = { host, port }
  return {
    name: 'web',
    args: [next, mode === 'dev' ? 'dev' : 'start', '-H', host, '-p', String(port)],
    nodeEnv: mode === 'dev' ? 'development' : 'production',
    loud: mode === 'dev',
    isReady: () => answersOk(healthUrl(settings)),
    readySeconds: 180,
    stopSeconds: 15,
  }
}

/** It has no port to ask; it says so itself when it has taken up its queues. */
const worker = ({ root }) => ({
  name: 'worker',
  args: script(root, 'scripts/worker.ts'),
  nodeEnv: 'production',
  isReady: (said) => said.includes('Worker is ready.'),
  stopSeconds: 25,
})

/** A real server on loopback in place of a hosted service; ready when all its ports take connections. */
const standIn = (root, name, ...ports) => ({
  name: `${name} stand-in`,
  args: script(root, `fakes/${name}/main.ts`),
  nodeEnv: 'production',
  isReady: async () => (await Promise.all(ports.map((port) => listensOn(port)))).every(Boolean),
  stopSeconds: 5,
})

/** The servers of the product: stand-ins for the services whose address was not given, the worker, the web. */
export function serversFor({ root, host, port, mode, owns, mailSmtpPort, mailPagePort, searchPort }) {
  return {
    standIns: [
      ...(owns.mail ? [standIn(root, 'mail', mailSmtpPort, mailPagePort)] : []),
      ...(owns.search ? [standIn(root, 'search', searchPort)] : []),
    ],
    worker: worker({ root }),
    web: web({ root, host, port, mode }),
  }
}
