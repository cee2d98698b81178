import '@/models/associations'
import type { Actor } from '@/lib/auth/actor'
import { may } from '@/lib/auth/policy'
import { episodeUrl, inSeconds } from '@/lib/episodes/views'
import { questionUrl } from '@/lib/questions/views'
import type { Answer } from '@/models/answer'
import type { Channel } from '@/models/channel'
import { Chapter } from '@/models/chapter'
import { Episode } from '@/models/episode'
import { Explainer } from '@/models/explainer'
import { Question } from '@/models/question'
import { Term } from '@/models/term'
import { publicQuestionStates } from './document-reads'
import type { EpisodeRef, Place } from './views'

type WithChannel = Episode & { channel: Channel }

const isPublic = (actor: Actor, row: Episode) => row.state === 'published' && may(actor, 'episode.see', row)

function episodeRef({ id, number, title, slug, channel }: WithChannel): EpisodeRef {
  const of = { slug: channel.slug, name: channel.name }
  return { id, number, title, url: episodeUrl(channel.slug, slug), channel: of }
}

function episodePlace(row: WithChannel, title: string): Place {
  const url = (second: number) => episodeUrl(row.channel.slug, row.slug, Math.round(second * 1000))
  return { title, url, episode: episodeRef(row) }
}

async function passages(actor: Actor, ids: string[]): Promise<[string, Place][]> {
  const rows = (await Chapter.findAll({
    where: { id: ids },
    include: [{ association: 'episode', where: { state: 'published' }, include: ['channel'] }],
  })) as (Chapter & { episode: WithChannel })[]
  return rows
    .filter(({ episode }) => isPublic(actor, episode))
    .map(({ id, title, episode }) => [`passage-${id}`, episodePlace(episode, title)])
}

/** Episodes, and what is spoken in one before its first chapter. */
async function episodes(actor: Actor, ids: string[]): Promise<[string, Place][]> {
  const where = { id: ids, state: 'published' as const }
  const rows = (await Episode.findAll({ where, include: ['channel'] })) as WithChannel[]
  return rows
    .filter((row) => isPublic(actor, row))
    .flatMap((row) => [
      [`episode-${row.id}`, episodePlace(row, row.title)],
      [`passage-${row.id}`, episodePlace(row, row.title)],
    ])
}

type LoadedQuestion = Question & { channel: Channel; answer: (Answer & { episode: WithChannel }) | null }

/** An answered question leads to the second of its follow-up while that is public, any other to its own page. */
function questionPlace(actor: Actor, { id, title, state, answer }: LoadedQuestion): Place {
  if (state !== 'answered' || !answer || !isPublic(actor, answer.episode)) {
    return { title, state, url: () => questionUrl(id) }
  }
  const range = { start: inSeconds(answer.startMs), end: inSeconds(answer.endMs) }
  return { ...episodePlace(answer.episode, title), state, range }
}

async function questions(actor: Actor, ids: string[]): Promise<[string, Place][]> {
  const rows = (await Question.findAll({
    where: { id: ids, state: publicQuestionStates },
    include: ['channel', { association: 'answer', include: [{ association: 'episode', include: ['channel'] }] }],
  })) as LoadedQuestion[]
  return rows
    .filter((row) => may(actor, 'question.see', row))
    .map((row) => [`question-${row.id}`, questionPlace(actor, row)])
}

async function handbook(ids: string[]): Promise<[string, Place][]> {
  const terms = await Term.findAll({ where: { id: ids } })
  const explainers = await Explainer.findAll({ where: { id: ids } })
  return [
    ...terms.map(({ id, slug, label }): [string, Place] => [
      `term-${id}`,
      { title: label, url: () => `/handbook/terms/${slug}` },
    ]),
    ...explainers.map(({ id, slug, title }): [string, Place] => [
      `explainer-${id}`,
      { title, url: () => `/handbook/explainers/${slug}` },
    ]),
  ]
}

/** `passage-<uuid>` → the uuid. */
const rowId = (documentId: string) => documentId.slice(documentId.indexOf('-') + 1)

/**
 * Where found documents lead, by document id. What is not public any more, or is not there, is left out: the index may
 * lag behind, the database never does. The same few queries however many were found.
 */
export async function placesOf(actor: Actor, documentIds: readonly string[]): Promise<Map<string, Place>> {
  const ids = [...new Set(documentIds.map(rowId))]
  if (ids.length === 0) return new Map()
  const found = await Promise.all([passages(actor, ids), episodes(actor, ids), questions(actor, ids), handbook(ids)])
  return new Map(found.flat())
}
