import { type AskFields, emptyFields, fieldsOf } from '@/lib/questions/form-rules'

const KEY = 'turnrow.question'

/**
 * What somebody has written and not sent, for this tab alone and until it is closed: a shared computer keeps nothing.
 * One draft at a time; it comes back on the form it was begun on.
 */
export function keepDraft(form: HTMLFormElement): void {
  try {
    sessionStorage.setItem(KEY, JSON.stringify(fieldsOf(new FormData(form))))
  } catch {
    // Storage is full or shut: the text still stands in the form.
  }
}

export function dropDraft(): void {
  try {
    sessionStorage.removeItem(KEY)
  } catch {
    // nothing was kept
  }
}

function readDraft(): AskFields | null {
  try {
    const kept: unknown = JSON.parse(sessionStorage.getItem(KEY) ?? 'null')
    if (typeof kept !== 'object' || kept === null) return null
    const texts = Object.entries(kept).filter((pair): pair is [string, string] => typeof pair[1] === 'string')
    return { ...emptyFields, ...Object.fromEntries(texts) }
  } catch {
    return null
  }
}

/**
 * Puts a kept draft into the fields that are still empty, as if it were typed; only on the form of the same place.
 * @returns whether anything was put back
 */
export function restoreDraft(form: HTMLFormElement): boolean {
  const draft = readDraft()
  const now = fieldsOf(new FormData(form))
  if (!draft || draft.episodeId !== now.episodeId || (now.channel && draft.channel !== now.channel)) return false
  let restored = false
  for (const name of ['channel', 'title', 'body', 'about'] as const) {
    const field = form.elements.namedItem(name)
    const typed = field instanceof HTMLInputElement || field instanceof HTMLTextAreaElement
    const open = typed || field instanceof HTMLSelectElement
    if (!open || !draft[name] || (typed && field.value)) continue
    field.value = draft[name]
    restored = true
    field.dispatchEvent(new Event('input', { bubbles: true }))
  }
  return restored
}
