import { literal, type Transaction } from 'sequelize'
import { inTransaction } from '@/lib/db'
import { MediaFailure } from '@/media/failure'
import { Footage } from '@/models/footage'
import { type FootageState, mostAttempts } from './rules'

/** Marks the footage as failed with what the owner should know, unless it has moved on meanwhile. */
export async function failFootage(
  footage: Footage,
  from: FootageState,
  problem: { code: string; reason: string },
  transaction?: Transaction,
): Promise<void> {
  await Footage.update(
    { state: 'failed', step: null, errorCode: problem.code, errorDetail: problem.reason },
    { where: { id: footage.id, state: from }, transaction },
  )
}

const givenUp = {
  code: 'interrupted',
  reason:
    'Work on this film was interrupted again and again, so it was given up. The film is kept as you sent it; try again, and tell whoever runs this installation if it fails once more.',
}

/**
 * Begins a piece of work on footage that is in `state`. Null where there is nothing to do: the row is gone, has moved on, or
 * has been begun too often. Counting happens before the work, so that a job that kills its worker is given up as well.
 */
export async function beginAttempt(footageId: string, state: FootageState): Promise<Footage | null> {
  return inTransaction(async (transaction) => {
    const footage = await Footage.findOne({ where: { id: footageId, state }, transaction, lock: true })
    if (!footage) return null
    if (footage.attempt >= mostAttempts) {
      await failFootage(footage, state, givenUp, transaction)
      return null
    }
    await footage.update({ attempt: literal('attempt + 1') as unknown as number }, { transaction })
    return footage
  })
}

/** What no second try can change becomes the footage's state; everything else goes back to the queue. */
export async function settleFailure(footage: Footage, state: FootageState, failure: unknown): Promise<void> {
  if (!(failure instanceof MediaFailure)) throw failure
  if (failure.kind === 'cancelled') return
  if (!failure.isPermanent) throw failure
  await failFootage(footage, state, failure)
}
