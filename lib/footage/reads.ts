import '@/models/associations'
import type { Actor } from '@/lib/auth/actor'
import { isPerson } from '@/lib/auth/actor'
import { may, permit } from '@/lib/auth/policy'
import { notFound } from '@/lib/errors'
import { services } from '@/lib/services'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { filmBase } from './film-address'
import { type FootageStatus, footageView, type LoadedFootage } from './views'

/** What inspection found, kept with the row; `preview` names the folder that is being filled. */
export type FilmNotes = { notes?: string[]; preview?: string | null }

/** The latest footage of an episode: what is on its way, or what is shown when nothing is. */
export const newestFootage = async (episodeId: string): Promise<LoadedFootage | null> =>
  Footage.findOne({ where: { episodeId }, order: [['createdAt', 'desc']], include: ['renditions'] })

async function receivedBytes(footage: Footage): Promise<number> {
  return (await services().storage.stat(`uploads/${footage.id}`))?.bytes ?? 0
}

/** @throws Problem 404 when the episode is not this desk's, or has no footage */
export async function readFootage(actor: Actor, episodeId: string): Promise<FootageStatus> {
  const episode = await Episode.findByPk(episodeId)
  permit(actor, 'footage.see', episode, 'This episode')
  const footage = await newestFootage(episodeId)
  if (!footage) throw notFound('Footage of this episode')
  const { notes = [], preview = null } = (footage.film ?? {}) as FilmNotes
  const playable = footage.folder ?? preview
  return {
    ...footageView(footage),
    ...(footage.state === 'receiving' ? { received: await receivedBytes(footage) } : {}),
    duration: footage.durationMs === null ? null : footage.durationMs / 1000,
    notes,
    preview: playable ? `${filmBase(playable, false)}/plain.mp4` : null,
    isShown: episode?.footageId === footage.id,
  }
}

/**
 * The row behind an upload address, for the person who began it. An address is no right: it goes on for the same person after
 * a new sign-in, and for nobody else. @throws Problem 404
 */
export async function readOwnUpload(actor: Actor, uploadId: string): Promise<Footage> {
  const isId = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/.test(uploadId)
  const footage =
    isId && isPerson(actor) ? await Footage.findOne({ where: { id: uploadId, uploadedBy: actor.id } }) : null
  const episode = footage && (await Episode.findByPk(footage.episodeId))
  if (!footage || !episode || !may(actor, 'footage.send', episode)) throw notFound('This upload')
  return footage
}

/** The same for a page, where no footage yet is an ordinary state and not an error. */
export async function readFootageIfAny(actor: Actor, episodeId: string): Promise<FootageStatus | null> {
  const episode = permit(actor, 'footage.see', await Episode.findByPk(episodeId), 'This episode')
  return (await Footage.count({ where: { episodeId: episode.id } })) === 0 ? null : readFootage(actor, episodeId)
}

/** Whether this actor may send films for an episode; advisers look on. */
export async function maySendFootage(actor: Actor, episodeId: string): Promise<boolean> {
  const episode = await Episode.findByPk(episodeId)
  return episode !== null && may(actor, 'footage.send', episode)
}
