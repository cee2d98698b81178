import { CautionNotes } from '@/components/questions/caution-notes'
import type { CueText } from '@/lib/captions/rules'
import type { EpisodeView } from '@/lib/episodes/views'
import type { TermNote } from '@/lib/handbook/views'
import { cautionsFor } from '@/lib/topics/cautions'
import { AnswersHere } from './answers-here'
import { AsSpoken } from './as-spoken'
import { AskHere } from './ask-here'
import { Film } from './film'
import { FilmPlace } from './film-place'
import { KeptPlace } from './kept-place'
import { PlaybackProvider } from './playback-context'
import { QuestionsPanel } from './questions-panel'
import { ReadingsPanel } from './readings-panel'
import { TheRow } from './the-row'
import { WatchHead } from './watch-head'
import { WatchPanels } from './watch-panels'

type WatchProps = {
  episode: EpisodeView
  spoken: CueText[]
  notes: TermNote[]
  /** Whom the viewer asks: the owner's first name. */
  askName: string
  /** The second that a link points to. */
  openAt: number | null
}

/**
 * The watch page. One grid serves both shapes: wide, the title over picture and row with the text
 * beside them; narrow, the picture first and held in view while the text runs under it.
 */
export function Watch({ episode, spoken, notes, askName, openAt }: WatchProps) {
  const { chapters, readings, questions, corrections } = episode
  const duration = episode.duration ?? chapters.at(-1)?.end ?? spoken.at(-1)?.end ?? 0
  const published = episode.state === 'published'
  return (
    <PlaybackProvider key={episode.id} at={Math.min(openAt ?? 0, duration)} duration={duration}>
      <KeptPlace episodeId={episode.id} openAt={openAt} />
      <div className="flex flex-col max-lg:-mx-[clamp(0.875rem,2.5vw,2rem)] lg:grid lg:grid-cols-[minmax(0,1.55fr)_minmax(0,1fr)] lg:grid-rows-[auto_auto_auto_1fr]">
        <WatchHead episode={episode} cautions={<CautionNotes cautions={cautionsOf(episode)} />}>
          {published && <AskHere episodeId={episode.id} askName={askName} className="max-lg:hidden print:hidden" />}
        </WatchHead>
        <div
          data-sticks="top"
          className="top-0 z-20 order-1 lg:col-start-1 lg:row-start-2 print:hidden max-lg:[@media(min-height:36em)]:sticky"
        >
          {episode.film ? (
            <Film title={episode.title} film={episode.film} captions={ownLanguageFirst(episode)} openAt={openAt ?? 0} />
          ) : (
            <FilmPlace footage={episode.footage} />
          )}
        </div>
        <div className="order-2 lg:col-start-1 lg:row-start-3 lg:border-x lg:border-rule print:hidden">
          <TheRow chapters={chapters} readings={readings} questions={questions} corrections={corrections} />
        </div>
        <WatchPanels
          counts={{ readings: readings.length, questions: questions.length }}
          spoken={
            <AsSpoken
              spoken={spoken}
              chapters={chapters}
              corrections={corrections}
              notes={Object.fromEntries(notes.map((note) => [note.slug, note]))}
            />
          }
          readings={<ReadingsPanel readings={readings} chapters={chapters} />}
          questions={<QuestionsPanel questions={questions} chapters={chapters} />}
        />
        {published && (
          <div
            data-sticks="foot"
            className="bottom-0 z-20 order-7 border-t border-rule bg-sheet px-3.5 py-2.5 lg:hidden print:hidden [@media(min-height:36em)]:sticky"
          >
            <AskHere episodeId={episode.id} askName={askName} className="w-full" />
          </div>
        )}
      </div>
      <AnswersHere answers={episode.answers} />
    </PlaybackProvider>
  )
}

const cautionsOf = ({ chapters }: EpisodeView) =>
  cautionsFor(chapters.flatMap(({ topics }) => topics.map(({ code }) => code)))

/** Captions in the language that is spoken come first: they are the ones shown until the viewer chooses. */
function ownLanguageFirst({ captions, language }: EpisodeView) {
  return captions.toSorted((a, b) => Number(b.language === language) - Number(a.language === language))
}
