import { endpoint } from '@/lib/http/endpoint'
import { describeApi } from '@/lib/http/openapi'
import { routes } from './routes'

export const GET = endpoint({ summary: 'This description' }, () => describeApi(routes))
