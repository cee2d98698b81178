'use server'

import { redirect } from 'next/navigation'
import { isPerson } from '@/lib/auth/actor'
import { currentActor } from '@/lib/auth/current'
import { Problem } from '@/lib/errors'
import { type AskFields, askBodyOf, fieldsOf } from './form-rules'
import { askInput } from './schema'
import { askQuestion } from './writes'

export type AskFormState = { fields: AskFields; problem: string | null; signIn?: true }

/** The asking form without JavaScript: on to the question, or the form again with everything in it and what is wrong. */
export async function sendQuestion(_before: AskFormState, form: FormData): Promise<AskFormState> {
  const fields = fieldsOf(form)
  const actor = await currentActor()
  if (!isPerson(actor)) return { fields, signIn: true, problem: 'Sign in to send it. What you wrote stays here.' }
  const input = askInput.safeParse(askBodyOf(fields))
  if (!input.success) {
    const [issue] = input.error.issues
    return { fields, problem: `${issue?.path.join('.') || 'The question'}: ${issue?.message ?? 'not understood'}` }
  }
  const asked = await askQuestion(actor, input.data).catch((failure: unknown) => failure)
  if (asked instanceof Problem) return { fields, problem: asked.detail }
  if (asked instanceof Error) throw asked
  redirect((asked as { url: string }).url)
}
