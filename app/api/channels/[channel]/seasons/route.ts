import { readChannelSeasons } from '@/lib/seasons/reads'
import { created } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { channelParams, newSeasonInput, seasonOutput, seasonsOutput } from '@/lib/seasons/schema'
import { createSeason } from '@/lib/seasons/writes'

export const GET = endpoint(
  { summary: 'Crop years of a channel, newest first', params: channelParams, output: seasonsOutput },
  ({ params }) => readChannelSeasons(params.channel),
)

export const POST = endpoint(
  { summary: 'Begin a season', params: channelParams, input: newSeasonInput, output: seasonOutput, creates: true },
  async ({ actor, params, input }) => {
    const season = await createSeason(actor, params.channel, input.year)
    const location = `/api/channels/${params.channel}/seasons/${season.year}`
    return created(season, { location, edition: season.edition })
  },
)
