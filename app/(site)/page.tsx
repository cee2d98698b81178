import { PageHead } from '@/components/frame/page-head'
import { EmptyState } from '@/components/ui/empty-state'
import { FarmRow } from '@/components/season/farm-row'
import { StagesToFind } from '@/components/season/stages-to-find'
import { WaitingQuestions } from '@/components/season/waiting-questions'
import { EpisodeRow } from '@/components/episodes/episode-row'
import { currentActor } from '@/lib/auth/current'
import { listChannels } from '@/lib/channels/reads'
import { now } from '@/lib/clock'
import { todayIn } from '@/lib/dates/rules'
import { newestEpisodes } from '@/lib/episodes/reads'
import { readQuestions } from '@/lib/questions/reads'
import { questionsQuery } from '@/lib/questions/schema'
import { currentSeasons } from '@/lib/seasons/reads'
import { filedStages } from '@/lib/topics/filed-reads'

const open = questionsQuery.parse({ state: 'new,queued,booked', sort: 'urgency', limit: 5 })

export default async function FrontPage() {
  const [actor, channels] = await Promise.all([currentActor(), listChannels()])
  const [seasons, episodes, stages, waiting] = await Promise.all([
    currentSeasons(channels),
    newestEpisodes(6),
    filedStages(),
    readQuestions(actor, open),
  ])
  return (
    <div className="page">
      <PageHead
        title="Lessons from working farms, filed by crop and growth stage"
        lead="Watch a season as it is worked, ask at the very second you are watching, and get your answer in a later episode."
      />
      <section aria-labelledby="farms">
        <h2 id="farms" className="mt-2 mb-3">
          Farms
        </h2>
        <ul className="sheet ruled">
          {channels.map((channel) => (
            <FarmRow
              key={channel.id}
              channel={channel}
              season={seasons.get(channel.id) ?? null}
              today={todayIn(channel.timeZone, now())}
            />
          ))}
        </ul>
        {channels.length === 0 && (
          <EmptyState title="No farm teaches here yet">
            The farms of this installation will stand here, each with its season. Whoever runs it opens the first one.
          </EmptyState>
        )}
      </section>
      <div className="mt-9 grid items-start gap-x-8 gap-y-9 lg:grid-cols-[minmax(0,1.6fr)_minmax(0,1fr)]">
        <NewestEpisodes episodes={episodes} />
        <div className="space-y-9">
          <StagesToFind filed={stages} />
          {waiting.items.length > 0 && (
            <section aria-labelledby="waiting">
              <h2 id="waiting" className="mb-3">
                Waiting for an answer
              </h2>
              <div className="sheet p-4 md:p-5">
                <WaitingQuestions questions={waiting.items} withFarm />
              </div>
            </section>
          )}
        </div>
      </div>
    </div>
  )
}

function NewestEpisodes({ episodes }: { episodes: Awaited<ReturnType<typeof newestEpisodes>> }) {
  return (
    <section aria-labelledby="newest">
      <h2 id="newest" className="mb-3">
        Newest episodes
      </h2>
      {episodes.length > 0 ? (
        <ul className="sheet ruled">
          {episodes.map((episode) => (
            <EpisodeRow key={episode.id} episode={episode} withFarm />
          ))}
        </ul>
      ) : (
        <EmptyState title="No episode is published yet" level={3}>
          The newest ones will stand here, with the stages they show.
        </EmptyState>
      )}
    </section>
  )
}
