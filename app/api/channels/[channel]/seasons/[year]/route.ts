import { noContent, tagged } from '@/lib/http/answers'
import { endpoint } from '@/lib/http/endpoint'
import { readSeason } from '@/lib/seasons/reads'
import { seasonInput, seasonOutput, seasonParams } from '@/lib/seasons/schema'
import { deleteSeason, saveSeason } from '@/lib/seasons/writes'

export const GET = endpoint(
  { summary: 'A season with its lanes', params: seasonParams, output: seasonOutput },
  async ({ params }) => {
    const season = await readSeason(params.channel, params.year)
    return tagged(season, season.edition)
  },
)

export const PUT = endpoint(
  { summary: 'Save a season', params: seasonParams, input: seasonInput, output: seasonOutput, edition: true },
  async ({ actor, params, input, edition }) => {
    const season = await saveSeason(actor, params.channel, params.year, input, edition)
    return tagged(season, season.edition)
  },
)

export const DELETE = endpoint(
  { summary: 'Take a season off the board', params: seasonParams, edition: true },
  async ({ actor, params, edition }) => {
    await deleteSeason(actor, params.channel, params.year, edition)
    return noContent()
  },
)
