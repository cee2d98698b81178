import { inTransaction } from '@/lib/db'
import { type LoadedChapter, chapterViews } from '@/lib/chapters/views'
import '@/models/associations'
import { CaptionTrack } from '@/models/caption-track'
import { Chapter } from '@/models/chapter'
import { Cue } from '@/models/cue'
import { Episode } from '@/models/episode'
import { Hearing } from '@/models/hearing'
import { Term } from '@/models/term'
import { markTerms } from './rules'

/** The language that the glossary's terms are written in. */
const glossaryLanguage = /^en\b/i

async function cuesIn(episodeId: string): Promise<Cue[]> {
  const tracks = await CaptionTrack.findAll({
    where: { episodeId, kind: ['captions', 'subtitles'] },
    order: [['language', 'asc']],
  })
  const track = tracks.find(({ language }) => glossaryLanguage.test(language))
  return track ? Cue.findAll({ where: { trackId: track.id }, order: [['startMs', 'asc']] }) : []
}

async function hearingsIn(episodeId: string) {
  const [cues, chapters, terms] = [
    await cuesIn(episodeId),
    await Chapter.findAll({ where: { episodeId }, include: ['topics'] }),
    await Term.findAll(),
  ]
  const ids = new Map(terms.map(({ slug, id }) => [slug, id]))
  const said = cues.map(({ startMs, endMs, plain }) => ({ start: startMs / 1000, end: endMs / 1000, text: plain }))
  const mentions = markTerms(said, chapterViews(chapters as LoadedChapter[], null), terms)
  const heard = new Map<string, { termId: string; episodeId: string; atMs: number; text: string }>()
  cues.forEach(({ startMs, plain }, n) => {
    for (const { slug } of mentions[n] ?? []) {
      const termId = ids.get(slug)
      // Two cues may begin in the same millisecond; a term is heard there once.
      if (termId) heard.set(`${termId} ${startMs}`, { termId, episodeId, atMs: startMs, text: plain })
    }
  })
  return [...heard.values()]
}

/**
 * Finds again where terms are heard in an episode, from its English captions. Runs twice to the same end; an episode
 * that is gone is left gone. The episode's row is locked, so that two runs do not write between each other.
 */
export async function hearTermsInEpisode({ episodeId }: { episodeId: string }): Promise<void> {
  await inTransaction(async (transaction) => {
    const episode = await Episode.findByPk(episodeId, { transaction, lock: true })
    if (!episode) return
    const heard = await hearingsIn(episodeId)
    await Hearing.destroy({ where: { episodeId }, transaction })
    await Hearing.bulkCreate(heard, { transaction })
  })
}
