import { endRunning } from './run.mjs'

/**
 * Does pieces of work side by side. At the first failure the programs that run are asked to end, and the failure is
 * thrown once all works have come to their end. @returns their answers
 */
export async function together(...works) {
  let first
  const onFailure = (error) => {
    first ??= error
    endRunning()
  }
  const answers = await Promise.all(works.map((work) => work().catch(onFailure)))
  if (first) throw first
  return answers
}
