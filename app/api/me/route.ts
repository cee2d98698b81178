import { requirePerson } from '@/lib/auth/policy'
import { endpoint } from '@/lib/http/endpoint'
import { meView } from '@/lib/people/views'

export const GET = endpoint({ summary: 'The person who is signed in, with their channels' }, ({ actor }) =>
  meView(requirePerson(actor)),
)
