import { mediaParams } from '@/lib/footage/schema'
import { serveFilm } from '@/lib/footage/serve-film'
import { endpoint } from '@/lib/http/endpoint'

const serve = endpoint(
  { summary: 'Playlists, segments and stills of a film', params: mediaParams },
  ({ request, params }) => serveFilm(request, params.path),
)

export { serve as GET, serve as HEAD }
