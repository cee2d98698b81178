import { endpoint } from '@/lib/http/endpoint'

export const dynamic = 'force-dynamic'
export const GET = endpoint({ summary: 'Whether this process is alive' }, () => ({ state: 'ok' }))
