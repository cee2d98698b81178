import { endpoint } from '@/lib/http/endpoint'
import { photoParams } from '@/lib/questions/schema'
import { servePhoto } from '@/lib/questions/serve-photo'

const serve = endpoint(
  { summary: 'A photo that came with a question', params: photoParams },
  ({ request, actor, params }) => servePhoto(request, actor, params.name),
)

export { serve as GET, serve as HEAD }
