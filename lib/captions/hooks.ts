import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { episodeKey } from '@/lib/episodes/hooks'
import { api, type ApiProblem } from '@/lib/http/client'
import type { TrackView } from './views'

type Brought = { file: File; language: string; kind: string }

/** Sends a caption file. What cannot be read comes back by line, and nothing is changed. */
export function useBringCaptions(episodeId: string) {
  const client = useQueryClient()
  const router = useRouter()
  return useMutation<TrackView, ApiProblem, Brought>({
    mutationFn: async ({ file, language, kind }) => {
      const form = new FormData()
      form.set('language', language)
      form.set('kind', kind)
      form.set('file', file)
      return (await api<TrackView>(`/api/episodes/${episodeId}/captions`, { method: 'POST', form })).data
    },
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: episodeKey(episodeId) })
      router.refresh()
    },
  })
}
