import { idParams } from '@/lib/episodes/schema'
import { noContent } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { personPatch } from '@/lib/site/schema'
import { editPerson } from '@/lib/site/writes'

export const PATCH = endpoint(
  { summary: 'Disable or let in again, make a site admin or not', params: idParams, input: personPatch },
  async ({ actor, params, input }) => {
    await editPerson(actor, params.id, input)
    return noContent()
  },
)
