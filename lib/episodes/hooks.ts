import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { api, type ApiProblem } from '@/lib/http/client'
import type { EpisodeView } from './views'

export const episodeKey = (id: string) => ['episode', id] as const

const isOnItsWay = (episode: EpisodeView | undefined) =>
  episode?.footage ? ['receiving', 'inspecting', 'encoding'].includes(episode.footage.state) : false

export const episodeQuery = (id: string) =>
  queryOptions({
    queryKey: episodeKey(id),
    queryFn: async ({ signal }) => (await api<EpisodeView>(`/api/episodes/${id}`, { signal })).data,
    // While the film is being made somebody is waiting for it.
    refetchInterval: ({ state }) => (isOnItsWay(state.data) ? 2_000 : false),
  })

/** The episode as this browser last saw it, beginning with what the page brought. */
export const useEpisode = (first: EpisodeView): EpisodeView =>
  useQuery({ ...episodeQuery(first.id), initialData: first }).data

type Change = { path: string; method: 'PATCH' | 'PUT' | 'POST'; body?: unknown; edition: number }

/**
 * One edit of an episode against the edition that was shown. What the server answers is the new episode; a refusal
 * (412 with `body.current`) changes nothing here.
 */
export function useEpisodeEdit(id: string) {
  const client = useQueryClient()
  const router = useRouter()
  return useMutation<EpisodeView, ApiProblem, Change>({
    mutationFn: async ({ path, method, body, edition }) =>
      (await api<EpisodeView>(`/api/episodes/${id}${path}`, { method, body, ifMatch: `"${edition}"` })).data,
    onSuccess: (episode) => {
      client.setQueryData(episodeKey(id), episode)
      // Lists and walk-round lines are drawn by the server.
      router.refresh()
    },
  })
}

export type EpisodeEdit = ReturnType<typeof useEpisodeEdit>
