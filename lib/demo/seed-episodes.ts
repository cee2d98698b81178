import { randomUUID } from 'node:crypto'
import type { Transaction } from 'sequelize'
import { languageLabel } from '@/lib/captions/views'
import { afterEpisodeChange } from '@/lib/episodes/after-change'
import { enqueue } from '@/lib/jobs/queue'
import { topicByCode } from '@/lib/topics/rules'
import { readCaptionFile } from '@/media/caption-file'
import { CaptionTrack } from '@/models/caption-track'
import { Chapter } from '@/models/chapter'
import { ChapterTopic } from '@/models/chapter-topic'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Reading } from '@/models/reading'
import { captionText } from './caption-text'
import { type CutSheet, momentOf } from './cut-sheet'
import { drawDemoFilm } from './jobs'
import { idOf, type Ids } from './seed-people'
import { seasonKey } from './seed-seasons'
import { ownerOf } from './story/channels'
import { episodes, filmed } from './story/story'
import type { StoryEpisode } from './story/types'

export type Cast = { channels: Ids; people: Ids; seasons: Ids; sheets: Map<string, CutSheet> }

const noonOf = (day: string) => new Date(`${day}T12:00:00Z`)

/** All episodes as they would stand had they been made when the story says, but for the films: those come by the queue. */
export async function seedEpisodes(cast: Cast, transaction: Transaction): Promise<Ids> {
  const ids: Ids = new Map()
  for (const episode of episodes) {
    const row = await seedEpisode(episode, cast, transaction)
    ids.set(episode.key, row.id)
    const sheet = cast.sheets.get(episode.key)
    if (!sheet) continue
    await seedChapters(row.id, episode, sheet, transaction)
    await seedCaptions(row.id, sheet, transaction)
    await seedReadings(row.id, episode, sheet, transaction)
    await queueFilm(row.id, episode, cast, transaction)
    await afterEpisodeChange(row.id, transaction)
  }
  return ids
}

function seedEpisode(episode: StoryEpisode, { channels, people, seasons }: Cast, transaction: Transaction) {
  const { channel, number, slug, title, summary, filmedOn, publishedOn, state, season } = episode
  const owner = idOf(people, ownerOf(channel))
  const isHazardous = episode.chapters.some(({ topics }) => topics.some((code) => topicByCode(code)?.hazardous))
  const publishedAt = publishedOn ? noonOf(publishedOn) : null
  return Episode.create(
    {
      ...{ number, slug, title, summary, filmedOn, state, publishedAt },
      channelId: idOf(channels, channel),
      seasonId: idOf(seasons, seasonKey(channel, season)),
      withdrawnAt: state === 'withdrawn' && publishedAt ? new Date(publishedAt.getTime() + 4 * 86_400_000) : null,
      cautionsConfirmedAt: isHazardous ? publishedAt : null,
      cautionsConfirmedBy: isHazardous ? owner : null,
      createdBy: owner,
      createdAt: noonOf(filmedOn),
    },
    { transaction },
  )
}

async function seedChapters(episodeId: string, { chapters }: StoryEpisode, sheet: CutSheet, transaction: Transaction) {
  for (const [index, { title, topics }] of chapters.entries()) {
    const startMs = sheet.chapters[index]?.startMs ?? 0
    const chapter = await Chapter.create({ episodeId, startMs, title }, { transaction })
    await ChapterTopic.bulkCreate(
      topics.map((code) => ({ chapterId: chapter.id, code })),
      { transaction },
    )
  }
}

/** The captions go through the same reader as a file that somebody sends. */
async function seedCaptions(episodeId: string, sheet: CutSheet, transaction: Transaction): Promise<void> {
  const { cues, errors } = readCaptionFile(Buffer.from(captionText(sheet)), 'captions.vtt')
  if (errors.length > 0) throw new Error(`captions of the demo: ${errors[0]?.message}`)
  const track = await CaptionTrack.create({ episodeId, language: 'en', label: languageLabel('en') }, { transaction })
  await Cue.bulkCreate(
    cues.map((cue) => ({ ...cue, trackId: track.id })),
    { transaction },
  )
}

async function seedReadings(episodeId: string, episode: StoryEpisode, sheet: CutSheet, transaction: Transaction) {
  const lines = episode.chapters.flatMap(({ lines }) => lines)
  const readings = lines.flatMap(({ reading, key }) =>
    reading && key ? [{ episodeId, atMs: momentOf(sheet, key).startMs, ...reading }] : [],
  )
  await Reading.bulkCreate(readings, { transaction })
}

/** The footage is on its way: the worker draws it, the newest film first, and sends it on as an upload would. */
async function queueFilm(episodeId: string, episode: StoryEpisode, { people }: Cast, transaction: Transaction) {
  const id = randomUUID()
  const uploadedBy = idOf(people, ownerOf(episode.channel))
  const file = { filename: `${episode.key}.mp4`, filetype: 'video/mp4', bytes: 0 }
  await Footage.create({ id, episodeId, uploadedBy, ...file }, { transaction })
  const priority = filmed.indexOf(episode) + 1
  await enqueue(drawDemoFilm, { footageId: id, episode: episode.key }, { transaction, key: id, priority })
}
