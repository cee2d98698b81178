import { endpoint } from '@/lib/http/endpoint'
import { joinQuestion } from '@/lib/questions/desk-writes'
import { joinInput, questionOutput, questionParams } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Join a question to another that asks the same',
    params: questionParams,
    input: joinInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => joinQuestion(actor, params.id, input),
)
