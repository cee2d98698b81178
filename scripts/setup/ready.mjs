import { connect } from 'node:net'

/** True where something takes connections on the port. */
export function listensOn(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const socket = connect({ port, host })
    const answer = (yes) => () => {
      socket.destroy()
      resolve(yes)
    }
    socket.setTimeout(1000, answer(false)).once('connect', answer(true)).once('error', answer(false))
  })
}

/** True where the address answers 200. */
export async function answersOk(url) {
  try {
    const answer = await fetch(url, { signal: AbortSignal.timeout(5000) })
    await answer.arrayBuffer()
    return answer.status === 200
  } catch {
    return false
  }
}
