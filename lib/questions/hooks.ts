import { keepPreviousData, queryOptions, useMutation, useQuery } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { api, type ApiProblem } from '@/lib/http/client'
import type { QuestionMove } from './rules'
import type { AnswerInput, AskInput, VerdictInput } from './schema'
import type { DeskQuestionView, LikenessView, QuestionView } from './views'

const at = (id: string, rest = '') => `/api/questions/${id}${rest}`

/** Shorter beginnings look like everything. */
const ENOUGH_LETTERS = 8

export const alikeQuery = (channel: string, text: string) =>
  queryOptions({
    queryKey: ['alike', channel, text] as const,
    queryFn: async ({ signal }) => {
      const path = `/api/questions/similar?${new URLSearchParams({ channel, q: text })}`
      return (await api<{ items: LikenessView[] }>(path, { signal })).data.items
    },
    enabled: text.trim().length >= ENOUGH_LETTERS,
    placeholderData: keepPreviousData,
    staleTime: 60_000,
  })

/** What looks like the text that is being written. */
export const useAlike = (channel: string, text: string) => useQuery(alikeQuery(channel, text))

export type Sent = { input: AskInput; photos: File[]; key: string }

function formOf({ input, photos }: Sent): FormData {
  const form = new FormData()
  for (const [name, value] of Object.entries(input))
    if (value !== null && value !== undefined) form.append(name, String(value))
  for (const photo of photos) form.append('photos', photo)
  return form
}

/** Sends a question; the same key again is the same question. */
export const useAsk = () =>
  useMutation<QuestionView, ApiProblem, Sent>({
    mutationFn: async (sent) => {
      const body = sent.photos.length > 0 ? { form: formOf(sent) } : { body: sent.input }
      return (await api<QuestionView>('/api/questions', { method: 'POST', idempotencyKey: sent.key, ...body })).data
    },
  })

export type Standing = { asking: number; youAreAsking: boolean }

/** "I'm asking too", and not any more. */
export const useAsking = (id: string) =>
  useMutation<Standing, ApiProblem, boolean>({
    mutationFn: async (asking) => (await api<Standing>(at(id, '/asking'), { method: asking ? 'PUT' : 'DELETE' })).data,
  })

export function useVerdict(id: string) {
  const router = useRouter()
  return useMutation<QuestionView, ApiProblem, VerdictInput>({
    mutationFn: async (body) => (await api<QuestionView>(at(id, '/verdict'), { method: 'POST', body })).data,
    onSuccess: () => router.refresh(),
  })
}

export type DeskMove = { move: QuestionMove; body?: object }

/** One move of the desk; the page draws itself anew after it, also when somebody else was quicker. */
export function useDeskMove(id: string) {
  const router = useRouter()
  return useMutation<DeskQuestionView, ApiProblem, DeskMove>({
    mutationFn: async ({ move, body }) =>
      (await api<DeskQuestionView>(at(id, `/${move}`), { method: 'POST', body: body ?? {} })).data,
    onSuccess: () => router.refresh(),
    onError: ({ status }) => status === 409 && router.refresh(),
  })
}

export function useAnswer(id: string) {
  const router = useRouter()
  return useMutation<DeskQuestionView, ApiProblem, AnswerInput>({
    mutationFn: async (body) => (await api<DeskQuestionView>(at(id, '/answer'), { method: 'POST', body })).data,
    onSuccess: () => router.refresh(),
  })
}
