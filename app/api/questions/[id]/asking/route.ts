import { endpoint } from '@/lib/http/endpoint'
import { startAsking, stopAsking } from '@/lib/questions/asking-writes'
import { askingOutput, questionParams } from '@/lib/questions/schema'

export const PUT = endpoint(
  { summary: 'I am asking too', params: questionParams, output: askingOutput },
  ({ actor, params }) => startAsking(actor, params.id),
)

export const DELETE = endpoint(
  { summary: 'I am not asking any more', params: questionParams, output: askingOutput },
  ({ actor, params }) => stopAsking(actor, params.id),
)
