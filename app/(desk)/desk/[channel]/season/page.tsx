import type { Metadata } from 'next'
import { PageHead } from '@/components/frame/page-head'
import { BeginSeason } from '@/components/season/editor/begin-season'
import { RemoveSeason } from '@/components/season/editor/remove-season'
import { SeasonAtDesk } from '@/components/season/editor/season-at-desk'
import { SeasonSwitch } from '@/components/season/season-switch'
import { ButtonLink } from '@/components/ui/button'
import { unitsOf } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { yearOf } from '@/lib/dates/rules'
import { forPage } from '@/lib/http/page'
import { readDeskSeason } from '@/lib/seasons/reads'
import { yearAsked } from '@/lib/seasons/schema'

export const metadata: Metadata = { title: 'Season' }

export default async function DeskSeasonPage({ params, searchParams }: PageProps<'/desk/[channel]/season'>) {
  const [{ channel: slug }, { season: asked }, actor] = await Promise.all([params, searchParams, currentActor()])
  const here = `/desk/${slug}/season`
  const desk = await forPage(readDeskSeason(actor, slug, yearAsked(asked)), here)
  const { channel, today, years, season, mayEdit } = desk
  const offered = Math.max(yearOf(today) - 1, ...years) + 1
  return (
    <div className="page">
      <PageHead
        title={season ? `The ${season.year} season` : 'Season'}
        lead="A lane for each crop and field, with the days of its growth stages. It is the front page of the farm."
        actions={
          season && (
            <>
              <SeasonSwitch years={years} shown={season.year} hrefOf={(year) => `${here}?season=${year}`} />
              <ButtonLink href={`${channel.url}?season=${season.year}`} variant="line">
                See it as published
              </ButtonLink>
            </>
          )
        }
      />
      <SeasonAtDesk {...desk} units={unitsOf(actor)} />
      {mayEdit && (
        <div className="mt-8 flex flex-wrap items-end justify-between gap-x-8 gap-y-4 border-t border-rule pt-5">
          <BeginSeason channel={slug} year={offered} main={years.length === 0} />
          {season && <RemoveSeason key={season.id} channel={slug} year={season.year} edition={season.edition} />}
        </div>
      )}
    </div>
  )
}
