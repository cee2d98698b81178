import type { Actor } from '@/lib/auth/actor'
import { notFound } from '@/lib/errors'
import { loadEpisode } from '@/lib/episodes/reads'
import { inSeconds } from '@/lib/episodes/views'
import { writeWebVtt } from '@/media/webvtt'
import { CaptionTrack } from '@/models/caption-track'
import { Cue } from '@/models/cue'
import { findingsOf, overlapsOf } from './lint'
import type { CueView, TrackView } from './views'

export const cuesOf = (trackId: string) =>
  Cue.findAll({
    where: { trackId },
    order: [
      ['startMs', 'asc'],
      ['endMs', 'asc'],
    ],
  })

function cueViews(rows: Cue[]): CueView[] {
  const plain = rows.map(({ startMs, endMs, plain: text, speaker }) => ({
    start: inSeconds(startMs),
    end: inSeconds(endMs),
    text,
    speaker,
  }))
  const overlaps = overlapsOf(plain)
  return plain.map((cue, n) => {
    const overlap = overlaps.get(n)
    return { ...cue, findings: [...(overlap ? [overlap] : []), ...findingsOf(cue)] }
  })
}

async function trackOf(actor: Actor, episodeId: string, language: string): Promise<CaptionTrack> {
  await loadEpisode(actor, { id: episodeId })
  const track = await CaptionTrack.findOne({ where: { episodeId, language } })
  if (!track) throw notFound('Captions in this language')
  return track
}

export type ReadTrack = { view: TrackView; edition: number }

/** The cues of one language with what is hard to read in them. @throws Problem 404 */
export async function readCaptions(actor: Actor, episodeId: string, language: string): Promise<ReadTrack> {
  const track = await trackOf(actor, episodeId, language)
  const { label, kind, checked, edition } = track
  const url = `/api/episodes/${episodeId}/captions/${language}.vtt`
  const cues = cueViews(await cuesOf(track.id))
  return { view: { language, label, kind, checked, url, cues, notes: [] }, edition }
}

/** The captions as a WebVTT file. @throws Problem 404 */
export async function readCaptionsFile(actor: Actor, episodeId: string, language: string): Promise<string> {
  const track = await trackOf(actor, episodeId, language)
  const rows = await cuesOf(track.id)
  return writeWebVtt(
    rows.map(({ startMs, endMs, text, speaker, settings }) => ({
      startMs,
      endMs,
      text: speaker && !text.startsWith('<v') ? `<v ${speaker.replace(/[<>&\n]/g, ' ')}>${text}</v>` : text,
      settings: settings ?? '',
    })),
  )
}
