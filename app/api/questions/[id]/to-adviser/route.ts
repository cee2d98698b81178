import { endpoint } from '@/lib/http/endpoint'
import { sendToAdviser } from '@/lib/questions/advice-writes'
import { questionOutput, questionParams, toAdviserInput } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Put a question before the advisers, by mail',
    params: questionParams,
    input: toAdviserInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => sendToAdviser(actor, params.id, input),
)
