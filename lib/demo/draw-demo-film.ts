import { createReadStream } from 'node:fs'
import { uploadName, finishFootage } from '@/lib/footage/writes'
import { services } from '@/lib/services'
import { NameTaken } from '@/media/storage'
import { Footage } from '@/models/footage'
import { drawFilm } from './draw-films'
import { demoFolder } from './folder'
import { ownerOf } from './story/channels'
import { filmed } from './story/story'
import { voiceLines } from './voice-lines'

/**
 * Draws a film and puts it where an upload ends, so that from there on it goes the way of any other footage. Does nothing
 * when the footage has arrived already or is gone.
 */
export async function drawAndSend({ footageId, episode: key }: { footageId: string; episode: string }): Promise<void> {
  const episode = filmed.find((one) => one.key === key)
  const footage = await Footage.findByPk(footageId)
  if (!episode || footage?.state !== 'receiving') return
  const folder = demoFolder()
  const film = await drawFilm(episode, await voiceLines(episode, ownerOf(episode.channel), folder), folder)
  await arrive(footage, film)
  await finishFootage(footageId)
}

/** The bytes, then the row: killed in between, the next try finds the name taken and goes on. */
async function arrive(footage: Footage, film: string): Promise<void> {
  const { storage } = services()
  const name = uploadName(footage.id)
  await storage.put(name, createReadStream(film)).catch((failure: unknown) => {
    if (!(failure instanceof NameTaken)) throw failure
  })
  const stored = await storage.stat(name)
  await Footage.update({ bytes: stored?.bytes ?? 0 }, { where: { id: footage.id, state: 'receiving' } })
}
