import { endpoint } from '@/lib/http/endpoint'
import { setAsideQuestion } from '@/lib/questions/desk-writes'
import { questionOutput, questionParams, setAsideInput } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Set a question aside with a reason',
    params: questionParams,
    input: setAsideInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => setAsideQuestion(actor, params.id, input),
)
