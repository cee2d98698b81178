import { endpoint } from '@/lib/http/endpoint'
import { bookQuestion } from '@/lib/questions/answer-writes'
import { bookInput, questionOutput, questionParams } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Put a question on the list of a coming episode',
    params: questionParams,
    input: bookInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => bookQuestion(actor, params.id, input),
)
