import { readCaptions, readCaptionsFile } from '@/lib/captions/reads'
import { cuesInput, languageOrFileParams } from '@/lib/captions/schema'
import { saveCues } from '@/lib/captions/writes'
import { languageParams } from '@/lib/episodes/schema'
import { tagged, text } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'

export const GET = endpoint(
  {
    summary: 'Cues with what is hard to read in them; `.vtt` behind the language gives the file',
    params: languageOrFileParams,
  },
  async ({ actor, params: { id, language } }) => {
    if (language.endsWith('.vtt')) return text(await readCaptionsFile(actor, id, language.slice(0, -4)), 'text/vtt')
    const { view, edition } = await readCaptions(actor, id, language)
    return tagged(view, edition)
  },
)

export const PUT = endpoint(
  { summary: 'Save edited cues', params: languageParams, input: cuesInput, edition: true },
  async ({ actor, params, input, edition }) => {
    const saved = await saveCues(actor, params, input, edition)
    return tagged(saved.view, saved.edition)
  },
)
