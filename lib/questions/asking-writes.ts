import { QueryTypes, type Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { db, inTransaction } from '@/lib/db'
import { Question } from '@/models/question'
import { refreshQuestion } from './moves'
import { QUESTION, readQuestion } from './reads'

type Standing = { asking: number; youAreAsking: boolean }
type Change = (questionId: string, userId: string, transaction: Transaction) => Promise<boolean>

async function changeAsking(actor: Actor, id: string, change: Change): Promise<Standing> {
  await inTransaction(async (transaction) => {
    const question = permit(actor, 'question.see', await Question.findByPk(id, { transaction }), QUESTION)
    permit(actor, 'question.asking', question)
    if (await change(id, requirePerson(actor).id, transaction)) await refreshQuestion(id, transaction)
  })
  const { asking, youAreAsking } = await readQuestion(actor, id)
  return { asking, youAreAsking }
}

const some = (sql: string, bind: unknown[], transaction: Transaction) =>
  db().query<object>(sql, { bind, type: QueryTypes.SELECT, transaction })

/** "I'm asking too". Said twice it counts once. */
export const startAsking = (actor: Actor, id: string): Promise<Standing> =>
  changeAsking(actor, id, async (questionId, userId, transaction) => {
    const made = await some(
      'insert into askings (question_id, user_id) values ($1, $2) on conflict do nothing returning question_id',
      [questionId, userId],
      transaction,
    )
    return made.length > 0
  })

/** "Not any more", also where it was asked in another question that is joined to this one: no letter comes. */
export const stopAsking = (actor: Actor, id: string): Promise<Standing> =>
  changeAsking(actor, id, async (questionId, userId, transaction) => {
    const gone = await some(
      `delete from askings where user_id = $2 and (question_id = $1
         or question_id in (select id from questions where joined_into = $1)) returning question_id`,
      [questionId, userId],
      transaction,
    )
    return gone.length > 0
  })
