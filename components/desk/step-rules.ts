import { dateAndTime } from '@/lib/dates/when'
import type { EpisodeView } from '@/lib/episodes/views'
import { timeCode } from '@/lib/times/rules'

export type Step = { slug: string; title: string; stands: string; done: boolean }

const counted = (count: number, one: string, many = `${one}s`) => `${count} ${count === 1 ? one : many}`

function footageStands({ footage, film, duration }: EpisodeView): string {
  if (!footage) return 'No film yet'
  const doing = { receiving: 'Being uploaded', inspecting: 'Being looked at', encoding: 'Sizes being made' }
  if (footage.state === 'failed') return film ? 'Replacement failed' : 'Could not be used'
  if (footage.state !== 'ready') return `${doing[footage.state]}, ${Math.round(footage.progress * 100)} %`
  return `${timeCode(duration ?? 0)}, ${counted(footage.renditions.length, 'size')} ready`
}

function chaptersStand({ chapters }: EpisodeView): string {
  const unfiled = chapters.filter(({ topics }) => topics.length === 0).length
  if (chapters.length === 0) return 'None set'
  return unfiled === 0 ? `${chapters.length} set and filed` : `${chapters.length} set, ${unfiled} without a topic`
}

function captionsStand({ captions }: EpisodeView): string {
  if (captions.length === 0) return 'None yet'
  return captions.map(({ label, checked }) => (checked ? label : `${label}, a draft`)).join(', ')
}

const isHazardous = ({ chapters }: EpisodeView) =>
  chapters.some(({ topics }) => topics.some(({ hazardous }) => hazardous))

function walkRoundStands(episode: EpisodeView): string {
  if (isHazardous(episode) && !episode.cautionsConfirmed) return 'Cautions to confirm'
  return readySoFar(episode) ? 'Nothing left to do' : 'Things left to do'
}

/** As far as the browser can see; the publish call looks for itself. */
const readySoFar = (episode: EpisodeView) =>
  episode.film !== null &&
  episode.chapters.length > 0 &&
  episode.chapters.every(({ topics }) => topics.length > 0) &&
  episode.captions.length > 0 &&
  (!isHazardous(episode) || episode.cautionsConfirmed)

function publishStands({ state, publishAt, publishedAt, channel }: EpisodeView): string {
  if (state === 'published' && publishedAt) return `Since ${dateAndTime(publishedAt, channel.timeZone)}`
  if (state === 'scheduled' && publishAt) return dateAndTime(publishAt, channel.timeZone)
  return state === 'withdrawn' ? 'Withdrawn' : 'Not yet'
}

/** The five steps of an episode in the order of the work. */
export function deskSteps(episode: EpisodeView): Step[] {
  const { film, chapters, captions, state } = episode
  const filed = chapters.length > 0 && chapters.every(({ topics }) => topics.length > 0)
  return [
    { slug: 'footage', title: 'Footage', stands: footageStands(episode), done: film !== null },
    { slug: 'chapters', title: 'Chapters', stands: chaptersStand(episode), done: filed },
    {
      slug: 'captions',
      title: 'Captions',
      stands: captionsStand(episode),
      done: captions.some(({ checked }) => checked),
    },
    { slug: 'walk-round', title: 'Walk-round', stands: walkRoundStands(episode), done: readySoFar(episode) },
    { slug: 'publish', title: 'Publish', stands: publishStands(episode), done: state === 'published' },
  ]
}
