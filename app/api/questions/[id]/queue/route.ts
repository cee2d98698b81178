import { endpoint } from '@/lib/http/endpoint'
import { queueQuestion } from '@/lib/questions/desk-writes'
import { questionOutput, questionParams } from '@/lib/questions/schema'

export const POST = endpoint(
  { summary: 'Put a question in the queue', params: questionParams, output: questionOutput },
  ({ actor, params }) => queueQuestion(actor, params.id),
)
