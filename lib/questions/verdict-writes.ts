import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { conflict } from '@/lib/errors'
import { Verdict } from '@/models/verdict'
import { askerIdsOf } from './asker-reads'
import { heldQuestion, leaveTrace, moveQuestion } from './moves'
import { QUESTION, readQuestion } from './reads'
import { refusal } from './rules'
import type { VerdictInput } from './schema'
import type { QuestionView } from './views'

/**
 * Whether the answer settles it, in the eyes of somebody who asks. "Not yet" opens the question again.
 * @throws Problem 409 when it is not answered, 403 for people who do not ask it
 */
export async function giveVerdict(actor: Actor, id: string, { settled, note }: VerdictInput): Promise<QuestionView> {
  await inTransaction(async (transaction) => {
    const question = permit(actor, 'question.see', await heldQuestion(id, transaction), QUESTION)
    permit(actor, 'question.verdict', { askerIds: await askerIdsOf(id) })
    if (question.state !== 'answered') throw conflict(refusal(question.state), { state: question.state })
    const userId = requirePerson(actor).id
    await Verdict.upsert({ questionId: id, userId, settled, note: note ?? null }, { transaction })
    if (settled)
      await leaveTrace(actor, id, { move: 'verdict', from: 'answered', to: 'answered', detail: note }, transaction)
    else await moveQuestion(actor, question, 'reopen', { detail: note ?? null }, transaction)
  })
  return readQuestion(actor, id)
}
