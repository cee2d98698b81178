import { useMutation } from '@tanstack/react-query'
import { api } from '@/lib/http/client'
import type { SeasonInput } from './schema'
import type { SeasonView } from './views'

const address = (channel: string, year?: number) =>
  `/api/channels/${encodeURIComponent(channel)}/seasons${year === undefined ? '' : `/${year}`}`

/** Saves the whole season over the edition that was read. */
export const useSaveSeason = (channel: string, year: number) =>
  useMutation({
    mutationFn: async ({ input, edition }: { input: SeasonInput; edition: number }) =>
      (await api<SeasonView>(address(channel, year), { method: 'PUT', body: input, ifMatch: `"${edition}"` })).data,
  })

export const useCreateSeason = (channel: string) =>
  useMutation({
    mutationFn: async (year: number) =>
      (await api<SeasonView>(address(channel), { method: 'POST', body: { year } })).data,
  })

export const useDeleteSeason = (channel: string, year: number) =>
  useMutation({
    mutationFn: (edition: number) => api(address(channel, year), { method: 'DELETE', ifMatch: `"${edition}"` }),
  })
