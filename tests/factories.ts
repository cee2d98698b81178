import { randomUUID } from 'node:crypto'
import type { Role } from '@/lib/auth/actor'
import { CaptionTrack } from '@/models/caption-track'
import { Channel } from '@/models/channel'
import { Chapter } from '@/models/chapter'
import { ChapterTopic } from '@/models/chapter-topic'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { Footage } from '@/models/footage'
import { Membership } from '@/models/membership'
import { Question } from '@/models/question'
import { Asking } from '@/models/asking'
import { Rendition } from '@/models/rendition'
import { User } from '@/models/user'

/** Each makes the least valid thing; what a test is about it says itself. */

let count = 0
const next = () => ++count

export const makeUser = (given: Partial<User['_creationAttributes']> = {}) =>
  User.create({ email: `person-${next()}-${randomUUID().slice(0, 8)}@farm.example`, name: `Person ${count}`, ...given })

export const makeChannel = (given: Partial<Channel['_creationAttributes']> = {}) =>
  Channel.create({ slug: `farm-${next()}`, name: `Farm ${count}`, ...given })

export async function makeMember(channel: Channel, role: Role): Promise<User> {
  const user = await makeUser()
  await Membership.create({ channelId: channel.id, userId: user.id, role })
  return user
}

export const makeEpisode = (channel: Channel, given: Partial<Episode['_creationAttributes']> = {}) =>
  Episode.create({
    channelId: channel.id,
    // Far from the numbers that createEpisode gives out by itself.
    number: 1000 + next(),
    slug: `made-${count}`,
    title: `Made ${count}`,
    ...(given.state === 'published' ? { publishedAt: new Date() } : {}),
    ...given,
  })

/** A footage with a film that is shown: the rows only, no file lies behind it. */
export async function makeFilm(episode: Episode, durationMs = 60_000): Promise<Footage> {
  const id = randomUUID()
  const footage = await Footage.create({
    id,
    episodeId: episode.id,
    filename: 'film.mp4',
    bytes: 1000,
    state: 'ready',
    progress: 1,
    durationMs,
    folder: id,
  })
  await Rendition.create({ footageId: id, height: 240, width: 426, bitrate: 150_000, bytes: 900, ready: true })
  await episode.update({ footageId: id })
  return footage
}

export async function makeChapter(episode: Episode, startMs: number, title: string, codes: string[] = []) {
  const chapter = await Chapter.create({ episodeId: episode.id, startMs, title })
  await ChapterTopic.bulkCreate(codes.map((code) => ({ chapterId: chapter.id, code })))
  return chapter
}

/** Captions from `[start ms, end ms, text]`. */
export async function makeCaptions(episode: Episode, cues: [number, number, string][], language = 'en') {
  const track = await CaptionTrack.create({ episodeId: episode.id, language, label: 'English' })
  await Cue.bulkCreate(cues.map(([startMs, endMs, text]) => ({ trackId: track.id, startMs, endMs, text, plain: text })))
  return track
}

export async function makeQuestion(
  channel: Channel,
  asker: User,
  given: Partial<Question['_creationAttributes']> = {},
) {
  const question = await Question.create({
    channelId: channel.id,
    askerId: asker.id,
    title: `Question ${next()}`,
    ...given,
  })
  await Asking.create({ questionId: question.id, userId: asker.id })
  return question
}
