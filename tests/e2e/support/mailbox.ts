import { expect } from '@playwright/test'

export type Letter = { id: string; to: string | string[]; subject: string; text: string; html: string | null }

const mailbox = process.env.E2E_MAILBOX_URL ?? 'http://127.0.0.1:2580'

export async function lettersTo(address: string): Promise<Letter[]> {
  const answer = await fetch(`${mailbox}/messages?to=${encodeURIComponent(address)}`)
  return (await answer.json()) as Letter[]
}

/** Waits until somebody has exactly one letter about something, as the worker sends it. */
export async function theLetter(address: string, about: string): Promise<Letter> {
  const found = async () => (await lettersTo(address)).filter(({ subject }) => subject.includes(about))
  await expect
    .poll(async () => (await found()).length, { timeout: 120_000, message: `a letter about ${about}` })
    .toBe(1)
  const [letter] = await found()
  if (!letter) throw new Error('the letter has gone again')
  return letter
}
