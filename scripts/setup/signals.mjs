import { endRunning } from './run.mjs'

// npm passes Ctrl-C on to us although the terminal has sent it already: the echo is not a second wish.
const echo = 1000

/**
 * Resolves at the first Ctrl-C, SIGTERM or closed terminal; what runs just then is asked to end.
 * A second signal, not its echo, kills everything and ends the process.
 */
export function firstSignal(house) {
  return new Promise((resolve) => {
    let since = 0
    const onSignal = (name) => {
      if (!since) {
        since = performance.now()
        house.stopping = true
        console.log(`\n${name}: stopping (once more kills at once)`)
        endRunning()
        resolve(name)
      } else if (performance.now() - since > echo) {
        console.log('Killed.')
        house.killAll()
        process.exit(130)
      }
    }
    for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(name, () => onSignal(name))
    whenNpmDies(() => onSignal('npm ended'))
    // Whoever read our words may leave before us.
    for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
  })
}

/**
 * Killed with -9, npm passes nothing on; without this we would live on unseen.
 * Started without npm we outlive our parent, as somebody who wrote `nohup node …` means it.
 */
function whenNpmDies(then) {
  if (!process.env.npm_lifecycle_event) return
  const parent = process.ppid
  const look = setInterval(() => {
    if (process.ppid === parent) return
    clearInterval(look)
    then()
  }, 500)
  look.unref()
}
