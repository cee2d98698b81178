import { type AskFields, emptyFields } from '@/lib/questions/form-rules'

export type Query = Record<string, string | string[] | undefined>

const first = (value: string | string[] | undefined) => (Array.isArray(value) ? value[0] : value) ?? ''

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i

type AskAsked = { episodeId: string | null; at: number | null; fields: AskFields; here: string }

/** What the address of the asking page says: `?episode=&t=` from an episode, `?channel=` from a farm's questions. */
export function askAsked(query: Query): AskAsked {
  const episode = first(query.episode)
  const t = Number(first(query.t) || NaN)
  const episodeId = UUID.test(episode) ? episode : null
  const at = episodeId && Number.isFinite(t) && t >= 0 ? Math.round(t * 1000) / 1000 : null
  const channel = first(query.channel)
  const kept = {
    ...(channel ? { channel } : {}),
    ...(episodeId ? { episode: episodeId } : {}),
    ...(at === null ? {} : { t: `${at}` }),
  }
  const search = new URLSearchParams(kept).toString()
  return {
    episodeId,
    at,
    fields: { ...emptyFields, channel, episodeId: episodeId ?? '', at: at === null ? '' : String(at) },
    here: `/questions/ask${search && `?${search}`}`,
  }
}
