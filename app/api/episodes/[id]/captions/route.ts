import { readCaptionsUpload } from '@/lib/captions/upload'
import { bringCaptions } from '@/lib/captions/writes'
import { idParams } from '@/lib/episodes/schema'
import { Answer, etagOf } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const POST = endpoint(
  { summary: 'Bring a WebVTT or SRT file', params: idParams, body: 'raw' },
  async ({ actor, params, request }) => {
    const { form, sent } = await readCaptionsUpload(request)
    const { view, edition } = await bringCaptions(actor, params.id, form, sent)
    return new Answer(201, view, { Location: view.url.replace(/\.vtt$/, ''), ETag: etagOf(edition) })
  },
)
