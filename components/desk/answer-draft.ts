import type { AnswerInput } from '@/lib/questions/schema'
import type { DeskQuestionView } from '@/lib/questions/views'
import { parseTime, writeTime } from '@/lib/times/parse'
import { timeCode } from '@/lib/times/rules'

/** An answer as it is being written: times as typed. */
export type AnswerDraft = { start: string; end: string; text: string }
export type DraftFaults = Partial<Record<keyof AnswerDraft, string>>

/** What was written for this episode; an answer on an earlier one is not carried over. */
export const draftOf = ({ answer }: DeskQuestionView, episodeId: string): AnswerDraft =>
  answer?.episodeId === episodeId
    ? { start: writeTime(answer.start), end: writeTime(answer.end), text: answer.text }
    : { start: '', end: '', text: '' }

const timeFault = (written: string, duration: number | null): string | undefined => {
  const second = parseTime(written)
  if (second === null) return 'Write minutes and seconds, such as 2:05.'
  if (duration !== null && second > duration) return `The episode ends at ${timeCode(duration)}.`
  return undefined
}

/** What keeps a draft from being saved. */
export function draftFaults({ start, end, text }: AnswerDraft, duration: number | null): DraftFaults {
  const [from, to] = [parseTime(start), parseTime(end)]
  const order = from !== null && to !== null && to <= from ? 'The end comes after the start.' : undefined
  return {
    start: timeFault(start, duration),
    end: timeFault(end, duration) ?? order,
    text: text.trim() ? undefined : 'A few words, for those who cannot watch now.',
  }
}

/** The body to send, or null while there is a fault. */
export function inputOf(draft: AnswerDraft, episodeId: string, duration: number | null): AnswerInput | null {
  const [start, end] = [parseTime(draft.start), parseTime(draft.end)]
  const sound = Object.values(draftFaults(draft, duration)).every((fault) => fault === undefined)
  return sound && start !== null && end !== null ? { episodeId, start, end, text: draft.text } : null
}
