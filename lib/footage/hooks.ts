import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'
import { episodeKey } from '@/lib/episodes/hooks'
import { api, ApiProblem } from '@/lib/http/client'
import type { FootageStatus } from './views'
import { isUnderWay } from './rules'

export const footageKey = (episodeId: string) => ['footage', episodeId] as const

const oneSecond = 1_000

const footageQuery = (episodeId: string) =>
  queryOptions({
    queryKey: footageKey(episodeId),
    queryFn: async ({ signal }): Promise<FootageStatus | null> => {
      const asked = api<FootageStatus>(`/api/episodes/${episodeId}/footage`, { signal })
      return asked.then(({ data }) => data, absent)
    },
    // Somebody is watching it being made; otherwise another browser may be sending, which is slow work.
    refetchInterval: ({ state: { data } }) => {
      if (!data) return false
      return isUnderWay(data.state) ? oneSecond : data.state === 'receiving' ? 5 * oneSecond : false
    },
  })

const absent = (failure: unknown): null => {
  if (failure instanceof ApiProblem && failure.status === 404) return null
  throw failure
}

/** The footage as it stands, beginning with what the page brought; null while there is none. */
export function useFootage(episodeId: string, first: FootageStatus | null) {
  const query = useQuery({ ...footageQuery(episodeId), initialData: first })
  useRefreshWhenReady(episodeId, query.data?.state ?? null)
  return { footage: query.data, isLost: query.isError || query.fetchStatus === 'paused' }
}

/** The step strip and the film of the episode change with the last step. */
function useRefreshWhenReady(episodeId: string, state: FootageStatus['state'] | null) {
  const client = useQueryClient()
  const router = useRouter()
  const before = useRef(state)
  useEffect(() => {
    if (before.current === state) return
    before.current = state
    void client.invalidateQueries({ queryKey: episodeKey(episodeId) })
    if (state === 'ready') router.refresh()
  }, [client, episodeId, router, state])
}

/** Tries failed footage again from the bytes that are kept. */
export function useRetryFootage(episodeId: string) {
  const client = useQueryClient()
  return useMutation<FootageStatus, ApiProblem>({
    mutationFn: async () =>
      (await api<FootageStatus>(`/api/episodes/${episodeId}/footage/retry`, { method: 'POST' })).data,
    onSuccess: (footage) => client.setQueryData(footageKey(episodeId), footage),
  })
}

/** What came or went has changed what the server knows. */
export function useFootageChanged(episodeId: string) {
  const client = useQueryClient()
  return () => client.invalidateQueries({ queryKey: footageKey(episodeId) })
}
