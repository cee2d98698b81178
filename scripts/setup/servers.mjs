import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
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

/** Its queues are made while it starts, so it goes before the web; it has no port to ask. */
function worker({ root }) {
  const since = { at: 0 }
  return {
    name: 'worker',
    args: script(root, 'scripts/worker.ts'),
    nodeEnv: 'production',
    isReady: async () => {
      since.at ||= performance.now()
      await sleep(200)
      return performance.now() - since.at > 1500
    },
    stopSeconds: 25,
  }
}

/** The servers of the product in the order of their start; the end goes backwards. */
export function serversFor({ mode, ...settings }) {
  const { root, owns, mailSmtpPort, mailPagePort, searchPort } = settings
  const fake = (name, ...ports) => ({
    name: `${name} stand-in`,
    args: script(root, `fakes/${name}/main.ts`),
    nodeEnv: 'production',
    isReady: async () => (await Promise.all(ports.map((port) => listensOn(port)))).every(Boolean),
    stopSeconds: 5,
  })
  return [
    ...(owns.mail ? [fake('mail', mailSmtpPort, mailPagePort)] : []),
    ...(owns.search ? [fake('search', searchPort)] : []),
    worker(settings),
    web({ ...settings, mode }),
  ]
}
