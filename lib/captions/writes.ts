import type { Transaction } from 'sequelize'
import type { Actor } from '@/lib/auth/actor'
import { permit } from '@/lib/auth/policy'
import { inTransaction } from '@/lib/db'
import { notFound, stale, unprocessable } from '@/lib/errors'
import { afterEpisodeChange } from '@/lib/episodes/after-change'
import { EPISODE } from '@/lib/episodes/reads'
import { inMs } from '@/lib/episodes/views'
import { ANY_EDITION } from '@/lib/http/parse'
import { readCaptionFile } from '@/media/caption-file'
import { escapeCueText } from '@/media/cues'
import { CaptionTrack } from '@/models/caption-track'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { type ReadTrack, readCaptions } from './reads'
import type { CaptionsForm, CuesInput } from './schema'
import { languageLabel } from './views'

type NewCue = { startMs: number; endMs: number; text: string; plain: string; speaker: string | null; settings: string }

async function replaceCues(track: CaptionTrack, cues: NewCue[], transaction: Transaction): Promise<void> {
  await Cue.destroy({ where: { trackId: track.id }, transaction })
  await Cue.bulkCreate(
    cues.map((cue) => ({ ...cue, trackId: track.id })),
    { transaction },
  )
  await afterEpisodeChange(track.episodeId, transaction)
}

type Sent = { bytes: Uint8Array; filename: string }

/**
 * Takes a WebVTT or SRT file as the captions of one language; a second file replaces the first.
 * @throws Problem 422 with `errors` by line when words or times would be lost; nothing is changed then
 */
export async function bringCaptions(actor: Actor, id: string, form: CaptionsForm, sent: Sent): Promise<ReadTrack> {
  permit(actor, 'captions.edit', await Episode.findByPk(id), EPISODE)
  const { cues, errors, notes } = readCaptionFile(sent.bytes, sent.filename)
  if (errors.length > 0) {
    const told = errors.slice(0, 100).map(({ line, message }) => ({ path: `line ${line}`, message }))
    throw unprocessable('The file cannot be read as captions. Nothing was changed.', told)
  }
  const { language, kind } = form
  await inTransaction(async (transaction) => {
    const [track] = await CaptionTrack.findOrCreate({
      where: { episodeId: id, language },
      defaults: { episodeId: id, language, kind, label: languageLabel(language) },
      transaction,
    })
    await CaptionTrack.increment('edition', { where: { id: track.id }, transaction })
    await track.update({ kind, checked: true }, { transaction })
    await replaceCues(track, cues, transaction)
  })
  const read = await readCaptions(actor, id, language)
  return { ...read, view: { ...read.view, notes } }
}

/** Every cue must end after it begins. */
function refuseBackward({ cues }: CuesInput): void {
  const wrong = cues.flatMap(({ start, end }, n) =>
    end > start ? [] : [{ path: `cues.${n}.end`, message: 'This caption ends before it begins.' }],
  )
  if (wrong.length > 0) throw unprocessable('A caption ends before it begins.', wrong)
}

/** Saves edited cues. @throws Problem 404 no such track, 412 when somebody saved a newer one, 422 */
export async function saveCues(
  actor: Actor,
  { id, language }: { id: string; language: string },
  input: CuesInput,
  edition: number,
): Promise<ReadTrack> {
  permit(actor, 'captions.edit', await Episode.findByPk(id), EPISODE)
  refuseBackward(input)
  await inTransaction(async (transaction) => {
    const track = await CaptionTrack.findOne({ where: { episodeId: id, language }, transaction })
    if (!track) throw notFound('Captions in this language')
    const { kind = track.kind, checked = track.checked } = input
    const [changed] = await CaptionTrack.update(
      { kind, checked, edition: track.edition + 1 },
      { where: { id: track.id, edition: edition === ANY_EDITION ? track.edition : edition }, transaction },
    )
    if (changed === 0) throw stale((await readCaptions(actor, id, language)).view)
    const cues = input.cues.map(({ start, end, text, speaker }) => ({
      startMs: inMs(start),
      endMs: inMs(end),
      text: escapeCueText(text),
      plain: text,
      speaker: speaker ?? null,
      settings: '',
    }))
    await replaceCues(track, cues, transaction)
  })
  return readCaptions(actor, id, language)
}
