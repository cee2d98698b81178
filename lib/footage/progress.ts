import { literal } from 'sequelize'
import { log } from '@/lib/log'
import { Footage } from '@/models/footage'

const everyMs = 400

/**
 * Writes progress to the row, one write at a time and not more often than people can see. It never runs backwards, not even
 * over a retry. Where the row is no longer being encoded (deleted, replaced), `gone` is called.
 */
export function progressWriter(footageId: string, gone: () => void) {
  let last = 0
  let queue: Promise<unknown> = Promise.resolve()
  const add = (write: () => Promise<unknown>) => {
    queue = queue.then(write).catch((failure: unknown) => log.warn({ err: failure, footageId }, 'progress not written'))
  }
  const write = async (fraction: number, step: string) => {
    const [changed] = await Footage.update(
      { progress: literal(`greatest(progress, ${Math.min(0.99, fraction).toFixed(4)})`) as unknown as number, step },
      { where: { id: footageId, state: 'encoding' } },
    )
    if (changed === 0) gone()
  }
  let step = ''
  return {
    tell(fraction: number, doing: string): void {
      const isDue = doing !== step || performance.now() - last >= everyMs
      if (!isDue) return
      last = performance.now()
      step = doing
      add(() => write(fraction, doing))
    },
    /** In order with the progress, so that a size is not told ready before what led to it. */
    alsoWrite: add,
    settled: (): Promise<unknown> => queue,
  }
}
