import type { Actor } from '@/lib/auth/actor'
import { chapterViews } from '@/lib/chapters/views'
import { filmBase } from '@/lib/footage/film-address'
import { footageView, type LoadedFootage } from '@/lib/footage/views'
import { CaptionTrack } from '@/models/caption-track'
import { Correction } from '@/models/correction'
import { Footage } from '@/models/footage'
import { Reading } from '@/models/reading'
import { Rendition } from '@/models/rendition'
import { answeredBy, askedOn } from './asked-and-answered'
import { headOf, type LoadedEpisode } from './line'
import { type CaptionsView, type EpisodeView, type FilmView, inSeconds } from './views'

async function filmOf(row: LoadedEpisode): Promise<FilmView | null> {
  const folder = row.footage?.folder
  if (!row.footage || !folder) return null
  const renditions = await Rendition.findAll({ where: { footageId: row.footage.id }, order: [['height', 'asc']] })
  const base = filmBase(folder, row.state === 'published')
  return {
    hls: `${base}/master.m3u8`,
    plain: `${base}/plain.mp4`,
    poster: `${base}/poster.jpg`,
    sizes: renditions.map(({ height, bitrate, bytes }) => ({ height, bitrate, bytes })),
  }
}

/** What is on its way now; beside a film that is already shown, this is its replacement. */
const newestFootage = (episodeId: string) =>
  Footage.findOne({ where: { episodeId }, order: [['createdAt', 'desc']], include: ['renditions'] })

const captionsView = (episodeId: string, track: CaptionTrack): CaptionsView => ({
  language: track.language,
  label: track.label,
  kind: track.kind,
  checked: track.checked,
  url: `/api/episodes/${episodeId}/captions/${track.language}.vtt`,
})

/** Everything about one episode that this actor may see. A fixed number of queries, whatever it holds. */
export async function wholeEpisode(row: LoadedEpisode, actor: Actor): Promise<EpisodeView> {
  const of = { where: { episodeId: row.id } }
  const footage = (await newestFootage(row.id)) as LoadedFootage | null
  const tracks = await CaptionTrack.findAll({ ...of, order: [['language', 'asc']] })
  const readings = await Reading.findAll({ ...of, order: [['atMs', 'asc']] })
  const corrections = await Correction.findAll({ ...of, order: [['atMs', 'asc']] })
  return {
    ...headOf(row),
    language: row.language,
    edition: row.edition,
    cautionsConfirmed: row.cautionsConfirmedAt !== null,
    footage: footage && footageView(footage),
    film: await filmOf(row),
    chapters: chapterViews(row.chapters, row.footage?.durationMs ?? null),
    captions: tracks.map((track) => captionsView(row.id, track)),
    readings: readings.map(({ atMs, quantity, value, unit, note }) => ({
      at: inSeconds(atMs),
      quantity,
      value,
      unit,
      note,
    })),
    corrections: corrections.map(({ id, atMs, said, amended, createdAt }) => ({
      id,
      at: inSeconds(atMs),
      said,
      right: amended,
      on: createdAt.toISOString(),
    })),
    questions: await askedOn(row.id, actor),
    answers: await answeredBy(row.id),
  }
}
