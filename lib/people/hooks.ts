import { useMutation } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { api, type ApiProblem } from '@/lib/http/client'

type Call = { path: string; method: 'POST' | 'PATCH' | 'DELETE'; body?: unknown }

/** One change to people, after which the page is drawn again by the server. */
export function usePeopleChange<T = unknown>() {
  const router = useRouter()
  return useMutation<T, ApiProblem, Call>({
    mutationFn: async ({ path, ...options }) => (await api<T>(path, options)).data,
    onSuccess: () => router.refresh(),
  })
}
