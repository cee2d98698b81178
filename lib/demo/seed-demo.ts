import { inTransaction } from '@/lib/db'
import { loadHandbook } from '@/lib/handbook/load-handbook'
import { Mark } from '@/models/mark'
import type { CutSheet } from './cut-sheet'
import { demoFolder } from './folder'
import { seedEpisodes } from './seed-episodes'
import { seedChannels, seedPeople } from './seed-people'
import { seedQuestions } from './seed-questions'
import { seedSeasons } from './seed-seasons'
import { ownerOf } from './story/channels'
import { filmed } from './story/story'
import { voiceLines } from './voice-lines'

const seeded = 'demo.seeded'

/**
 * Fills an installation with the demo, once. The voices come first, because captions and chapters stand where the
 * words are heard; then everything is written in one transaction with the mark that says so. Killed anywhere, it starts
 * again and finds the voices it has made. The films are drawn by the worker.
 * @returns false when the demo was there already
 */
export async function seedDemo(say: (line: string) => void): Promise<boolean> {
  if (await Mark.findByPk(seeded)) return false
  await loadHandbook()
  const sheets = await voiceAll(say)
  say('Writing channels, seasons, episodes and questions')
  return inTransaction(async (transaction) => {
    // Two seeds at once: the second one waits here, and then has nothing to do.
    const [, isFirst] = await Mark.findOrCreate({
      where: { key: seeded },
      defaults: { key: seeded, value: true },
      transaction,
    })
    if (!isFirst) return false
    const channels = await seedChannels(transaction)
    const people = await seedPeople(channels, transaction)
    const seasons = await seedSeasons(channels, transaction)
    const cast = { channels, people, seasons, sheets }
    await seedQuestions(cast, await seedEpisodes(cast, transaction), transaction)
    return true
  })
}

/** Two at a time, one for each core of a small machine. */
async function voiceAll(say: (line: string) => void): Promise<Map<string, CutSheet>> {
  const sheets = new Map<string, CutSheet>()
  const waiting = [...filmed]
  const voiceNext = async (): Promise<void> => {
    for (let episode = waiting.shift(); episode; episode = waiting.shift()) {
      const { sheet } = await voiceLines(episode, ownerOf(episode.channel), demoFolder())
      sheets.set(episode.key, sheet)
      say(`Voices: ${sheets.size} of ${filmed.length}, ${episode.title}`)
    }
  }
  await Promise.all([voiceNext(), voiceNext()])
  return sheets
}
