import { basename } from 'node:path'
import { inTransaction } from '@/lib/db'
import { afterEpisodeChange } from '@/lib/episodes/after-change'
import { services } from '@/lib/services'
import {
  type EncodedFilm,
  encodeFilm,
  readEncoded,
  type Rendition as MadeRendition,
  workingPrefix,
} from '@/media/encode'
import type { Film } from '@/media/inspect'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Rendition } from '@/models/rendition'
import { beginAttempt, settleFailure } from './attempts'
import { progressWriter } from './progress'
import { uploadName } from './writes'

/**
 * Job body: footage becomes the film that its episode shows. The folder carries the id of the footage and appears by one
 * rename; the row is switched in one transaction after it. A worker killed in between finds the folder and only switches.
 */
export async function encodeFootageById({ footageId }: { footageId: string }): Promise<void> {
  const footage = await beginAttempt(footageId, 'encoding')
  const episode = footage && (await Episode.findByPk(footage.episodeId))
  if (!footage || !episode) return
  const folder = services().storage.localPath(`films/${footageId}`)
  try {
    await removeLeftovers(footageId)
    const encoded = (await readEncoded(folder)) ?? (await encode(footage, folder, episode.language))
    await switchOver(footage, encoded)
    await removeLeftovers(footageId)
  } catch (failure) {
    await settleFailure(footage, 'encoding', failure)
  }
}

/** What a killed worker had half made of this footage. One worker at a time works on it. */
async function removeLeftovers(footageId: string): Promise<void> {
  const { storage } = services()
  const names = await storage.list('films')
  for (const name of names) if (name.startsWith(`${workingPrefix}${footageId}-`)) await storage.remove(`films/${name}`)
}

async function encode(footage: Footage, folder: string, language: string): Promise<EncodedFilm> {
  const stop = new AbortController()
  const progress = progressWriter(footage.id, () => stop.abort())
  try {
    return await encodeFilm({
      source: services().storage.localPath(uploadName(footage.id)),
      film: footage.film as unknown as Film,
      folder,
      language,
      signal: stop.signal,
      onProgress: progress.tell,
      onRendition: (rendition, working) => progress.alsoWrite(() => showEarly(footage, rendition, basename(working))),
    })
  } finally {
    await progress.settled()
  }
}

const rowOf = (footageId: string, made: MadeRendition) => ({
  footageId,
  height: made.height,
  width: Math.max(made.pixelsWide, made.pixelsHigh),
  bitrate: made.bitrate,
  bytes: made.bytes,
  ready: true,
})

/** A finished size is told at once, with the working folder as a preview for the desk. */
async function showEarly(footage: Footage, made: MadeRendition, preview: string): Promise<void> {
  await Rendition.upsert(rowOf(footage.id, made))
  await Footage.update({ film: { ...footage.film, preview } }, { where: { id: footage.id, state: 'encoding' } })
}

/** The one switch. A film that was sent later and is shown already stays. Chapters and captions are left as they are. */
const switchOver = (footage: Footage, encoded: EncodedFilm) =>
  inTransaction(async (transaction) => {
    const [changed] = await Footage.update(
      {
        state: 'ready',
        step: null,
        progress: 1,
        folder: footage.id,
        durationMs: Math.max(1, Math.round(encoded.durationS * 1000)),
        film: { ...footage.film, preview: null, sound: encoded.sound },
      },
      { where: { id: footage.id, state: 'encoding' }, transaction },
    )
    if (changed === 0) return
    await Rendition.destroy({ where: { footageId: footage.id }, transaction })
    await Rendition.bulkCreate(
      encoded.renditions.map((made) => rowOf(footage.id, made)),
      { transaction },
    )
    const episode = await Episode.findByPk(footage.episodeId, { transaction, lock: true })
    const shown = episode?.footageId ? await Footage.findByPk(episode.footageId, { transaction }) : null
    if (!episode || (shown && shown.createdAt > footage.createdAt)) return
    await episode.update({ footageId: footage.id }, { transaction })
    await afterEpisodeChange(episode.id, transaction)
  })
