import { notFound } from '@/lib/errors'
import { endpoint } from '@/lib/http/endpoint'

const nothing = endpoint({ summary: 'Nothing is here', open: true }, () => {
  throw notFound('This address')
})

/** An unknown address under /api is told like every other refusal, and not as a page. */
export { nothing as DELETE, nothing as GET, nothing as PATCH, nothing as POST, nothing as PUT }
