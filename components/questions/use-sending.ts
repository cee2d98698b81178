import { useRouter } from 'next/navigation'
import { useRef, type FormEvent } from 'react'
import { askBodyOf, fieldsOf } from '@/lib/questions/form-rules'
import { useAsk } from '@/lib/questions/hooks'
import type { AskInput } from '@/lib/questions/schema'
import { dropDraft, keepDraft } from './ask-draft'

const photosOf = (form: FormData) =>
  form.getAll('photos').filter((value): value is File => value instanceof File && value.size > 0)

/** Sends the form through the API: by way of the door where nobody is signed in, with the text kept. */
export function useSending({ signedIn, here }: { signedIn: boolean; here: string }) {
  const router = useRouter()
  const ask = useAsk()
  // One key for one question: pressed twice, or again after a lost line, it is asked once.
  const key = useRef<string | null>(null)
  const toTheDoor = () => router.push(`/sign-in?callbackUrl=${encodeURIComponent(here)}`)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    keepDraft(event.currentTarget)
    if (!signedIn) return toTheDoor()
    const form = new FormData(event.currentTarget)
    key.current ??= crypto.randomUUID()
    const sent = { input: askBodyOf(fieldsOf(form)) as AskInput, photos: photosOf(form), key: key.current }
    ask.mutate(sent, {
      onSuccess: ({ url }) => {
        dropDraft()
        router.push(url)
      },
      onError: ({ status }) => {
        if (status >= 400 && status < 500) key.current = null
        if (status === 401) toTheDoor()
      },
    })
  }
  return { submit, failure: ask.error, isPending: ask.isPending || ask.isSuccess }
}
