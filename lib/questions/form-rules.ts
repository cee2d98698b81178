import { crops, type Crop } from '@/lib/topics/crops'
import { topicByCode } from '@/lib/topics/rules'

/** The fields of the asking form, as text; kept while somebody signs in, and given back when something is refused. */
export type AskFields = { channel: string; title: string; body: string; about: string; episodeId: string; at: string }

export const emptyFields: AskFields = { channel: '', title: '', body: '', about: '', episodeId: '', at: '' }

const textOf = (form: FormData, name: string) => {
  const value = form.get(name)
  // Browsers send line ends of two signs; the text is kept with one.
  return typeof value === 'string' ? value.replace(/\r\n/g, '\n') : ''
}

export const fieldsOf = (form: FormData): AskFields => ({
  channel: textOf(form, 'channel'),
  title: textOf(form, 'title'),
  body: textOf(form, 'body'),
  about: textOf(form, 'about'),
  episodeId: textOf(form, 'episodeId'),
  at: textOf(form, 'at'),
})

/** One choice for crop and stage: a crop alone (`wheat`), or a stage with its crop (`wheat-31`, `soil`). */
export function subjectChosen(about: string): { crop: Crop | null; stage: string | null } {
  const crop = crops.find((one) => one === about)
  if (crop) return { crop, stage: null }
  const topic = topicByCode(about)
  return topic?.kind === 'stage' ? { crop: topic.crop, stage: topic.code } : { crop: null, stage: null }
}

/** What goes to POST /api/questions; still to be held against `askInput`. */
export function askBodyOf(fields: AskFields) {
  const { channel, title, body, about, episodeId, at } = fields
  return {
    channel,
    title,
    body,
    ...subjectChosen(about),
    episodeId: episodeId || null,
    at: episodeId && at !== '' ? Number(at) : null,
  }
}
