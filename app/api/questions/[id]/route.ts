import { tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readForActor } from '@/lib/questions/desk-reads'
import { questionOutput, questionParams } from '@/lib/questions/schema'

export const GET = endpoint(
  { summary: 'One question', params: questionParams, output: questionOutput },
  async ({ actor, params }) => {
    const question = await readForActor(actor, params.id)
    return tagged(question, question.edition)
  },
)
