import { endpoint } from '@/lib/http/endpoint'
import { answerQuestion } from '@/lib/questions/answer-writes'
import { answerInput, questionOutput, questionParams } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Say which seconds of an episode answer the question',
    params: questionParams,
    input: answerInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => answerQuestion(actor, params.id, input),
)
