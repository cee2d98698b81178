import { endpoint } from '@/lib/http/endpoint'
import { questionOutput, questionParams, verdictInput } from '@/lib/questions/schema'
import { giveVerdict } from '@/lib/questions/verdict-writes'

export const POST = endpoint(
  {
    summary: 'Say whether the answer settles it; "not yet" opens the question again',
    params: questionParams,
    input: verdictInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => giveVerdict(actor, params.id, input),
)
