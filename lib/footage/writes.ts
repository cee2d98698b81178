import { randomUUID } from 'node:crypto'
import { sync } from '@/media/files'
import type { Actor } from '@/lib/auth/actor'
import { permit, requirePerson } from '@/lib/auth/policy'
import { now } from '@/lib/clock'
import { inTransaction } from '@/lib/db'
import { conflict } from '@/lib/errors'
import { enqueue } from '@/lib/jobs/queue'
import { services } from '@/lib/services'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { inspectFootage } from './jobs'
import { newestFootage, readFootage } from './reads'
import { cleanFilename, cleanFiletype, keptDays } from './rules'
import type { UploadMetadata } from './schema'
import type { FootageStatus } from './views'

export const uploadName = (footageId: string): string => `uploads/${footageId}`

/** Opens an upload for an episode. @throws Problem 404 for an episode of another channel, 401, 403 */
export async function beginFootage(actor: Actor, metadata: UploadMetadata, bytes: number): Promise<Footage> {
  const episode = permit(actor, 'footage.send', await Episode.findByPk(metadata.episodeId), 'This episode')
  return Footage.create({
    id: randomUUID(),
    episodeId: episode.id,
    uploadedBy: requirePerson(actor).id,
    filename: cleanFilename(metadata.filename ?? ''),
    filetype: cleanFiletype(metadata.filetype),
    bytes,
    expiresAt: new Date(now().getTime() + keptDays * 24 * 3600_000),
  })
}

/**
 * All bytes are there: state and job change together, once, however often this is called. The bytes are brought to disk
 * first, because from here on nobody will send them again.
 */
export async function finishFootage(footageId: string): Promise<boolean> {
  await sync(services().storage.localPath(uploadName(footageId)))
  return inTransaction(async (transaction) => {
    const [changed] = await Footage.update(
      { state: 'inspecting', step: 'inspecting', progress: 0, expiresAt: null },
      { where: { id: footageId, state: 'receiving' }, transaction },
    )
    if (changed === 0) return false
    await enqueue(inspectFootage, { footageId }, { transaction, key: footageId })
    return true
  })
}

/** How far an upload has come, for whoever looks on; the bytes on disk are the truth that HEAD tells. */
export async function noteReceived({ id, bytes }: Footage, offset: number): Promise<void> {
  const progress = bytes > 0 ? Math.min(1, offset / bytes) : 0
  await Footage.update({ progress }, { where: { id, state: 'receiving' } })
}

/** Forgets an upload that was given up: bytes first, so that a crash in between leaves a row that is found again. */
export async function forgetUpload(footageId: string): Promise<void> {
  const { storage } = services()
  await storage.remove(uploadName(footageId))
  await storage.remove(`${uploadName(footageId)}.json`)
  await Footage.destroy({ where: { id: footageId, state: 'receiving' } })
}

/** Tries a failed film again from the bytes that are still there. @throws Problem 404, 403, 409 when it has not failed */
export async function retryFootage(actor: Actor, episodeId: string): Promise<FootageStatus> {
  permit(actor, 'footage.send', await Episode.findByPk(episodeId), 'This episode')
  const footage = await newestFootage(episodeId)
  if (footage?.state !== 'failed') throw conflict('Only a film that could not be used can be tried again.')
  if (!(await services().storage.stat(uploadName(footage.id)))) throw conflict('The file is gone. Send the film again.')
  await inTransaction(async (transaction) => {
    const [changed] = await Footage.update(
      { state: 'inspecting', step: 'inspecting', progress: 0, attempt: 0, errorCode: null, errorDetail: null },
      { where: { id: footage.id, state: 'failed' }, transaction },
    )
    if (changed > 0) await enqueue(inspectFootage, { footageId: footage.id }, { transaction, key: footage.id })
  })
  return readFootage(actor, episodeId)
}
