import type { Actor } from '@/lib/auth/actor'
import { cuesOf } from '@/lib/captions/reads'
import type { CueText } from '@/lib/captions/rules'
import { spokenTerms } from '@/lib/handbook/spoken-terms'
import type { TermNote } from '@/lib/handbook/views'
import '@/models/associations'
import { CaptionTrack } from '@/models/caption-track'
import { Membership } from '@/models/membership'
import type { User } from '@/models/user'
import { readEpisodeBySlug } from './reads'
import { type EpisodeView, inSeconds } from './views'

export type WatchPage = {
  episode: EpisodeView
  spoken: CueText[]
  notes: TermNote[]
  /** whom a viewer asks: the owner's first name, else the channel's name */
  askName: string
}

/** The captions that are set as running text: the episode's own language before any other. */
async function spokenCues({ id, language }: EpisodeView) {
  const tracks = await CaptionTrack.findAll({ where: { episodeId: id, kind: ['captions', 'subtitles'] } })
  const track = tracks.find((one) => one.language === language) ?? tracks[0]
  const rows = track ? await cuesOf(track.id) : []
  return rows.map(({ startMs, endMs, plain, speaker }) => ({
    start: inSeconds(startMs),
    end: inSeconds(endMs),
    text: plain,
    speaker,
  }))
}

async function askNameOf(channel: EpisodeView['channel']): Promise<string> {
  const owner = (await Membership.findOne({
    where: { role: 'owner', '$channel.slug$': channel.slug },
    include: ['user', 'channel'],
    order: [['createdAt', 'asc']],
  })) as (Membership & { user: User }) | null
  return owner?.user.name.split(/\s+/)[0] ?? channel.name
}

/** Everything the watch page shows. @throws Problem 404 when it is not there or not visible to this actor */
export async function readWatchPage(actor: Actor, channel: string, slug: string): Promise<WatchPage> {
  const episode = await readEpisodeBySlug(actor, channel, slug)
  const cues = await spokenCues(episode)
  const { mentions, notes } = await spokenTerms(cues, episode.chapters)
  return {
    episode,
    spoken: cues.map((cue, n) => ({ ...cue, terms: mentions[n] ?? [] })),
    notes,
    askName: await askNameOf(episode.channel),
  }
}
