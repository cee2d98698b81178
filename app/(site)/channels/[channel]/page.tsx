import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { BesideBoard } from '@/components/season/beside-board'
import { BoardList } from '@/components/season/board-list'
import { NoSeason } from '@/components/season/no-season'
import { SeasonBoard } from '@/components/season/season-board'
import { SeasonSwitch } from '@/components/season/season-switch'
import { unitsOf } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { readChannel } from '@/lib/channels/reads'
import { forPage } from '@/lib/http/page'
import { readQuestions } from '@/lib/questions/reads'
import { questionsQuery } from '@/lib/questions/schema'
import { readBoard, thisWeekInOtherYears } from '@/lib/seasons/reads'
import { yearAsked } from '@/lib/seasons/schema'

/** The questions that an answer would help soonest. */
const waiting = questionsQuery.parse({ state: 'new,queued,booked', sort: 'urgency', limit: 4 })

export async function generateMetadata({ params }: PageProps<'/channels/[channel]'>): Promise<Metadata> {
  const { name, blurb } = await forPage(readChannel((await params).channel))
  return { title: `${name}: the season`, description: blurb || undefined }
}

export default async function SeasonPage({ params, searchParams }: PageProps<'/channels/[channel]'>) {
  const [{ channel: slug }, { season: asked }, actor] = await Promise.all([params, searchParams, currentActor()])
  const { channel, today, years, season, episodes } = await forPage(readBoard(slug, yearAsked(asked)))
  const [otherYears, open] = await Promise.all([
    thisWeekInOtherYears(channel, today),
    readQuestions(actor, { ...waiting, channel: slug }),
  ])
  const board = season && { season, episodes, today, units: unitsOf(actor), episodesUrl: `${channel.url}/episodes` }
  return (
    <div className="page">
      <PageHead
        title={season ? `The ${season.year} season at ${channel.name}` : channel.name}
        lead={
          season
            ? 'Every episode sits on the day it was filmed, over the growth stage the crop was in. Pick a mark, or pick a stage.'
            : channel.blurb
        }
        actions={
          season && (
            <SeasonSwitch years={years} shown={season.year} hrefOf={(year) => `${channel.url}?season=${year}`} />
          )
        }
      />
      {board ? <SeasonBoard {...board} /> : <NoSeason channel={channel} actor={actor} />}
      {board && <BoardList {...board} />}
      <BesideBoard today={today} otherYears={otherYears} waiting={open.items} channel={channel} />
    </div>
  )
}
