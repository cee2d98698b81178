import { endpoint } from '@/lib/http/endpoint'
import { askForDetail } from '@/lib/questions/advice-writes'
import { askDetailInput, questionOutput, questionParams } from '@/lib/questions/schema'

export const POST = endpoint(
  {
    summary: 'Ask the asker for detail, by mail',
    params: questionParams,
    input: askDetailInput,
    output: questionOutput,
  },
  ({ actor, params, input }) => askForDetail(actor, params.id, input),
)
