import { describe, expect, it } from 'vitest'
import {
  afterMove,
  deskMovesIn,
  isOpen,
  questionMoves,
  questionStates,
  refusal,
  type QuestionMove,
  type QuestionState,
} from '@/lib/questions/rules'

/** What each move makes of each state, as product.md and api.md have it; a dash is a refusal. */
const table: Record<QuestionMove, Record<QuestionState, QuestionState | '-'>> = {
  queue: { new: 'queued', queued: '-', booked: 'queued', answered: '-', 'set-aside': 'queued', joined: 'queued' },
  join: { new: 'joined', queued: 'joined', booked: '-', answered: '-', 'set-aside': '-', joined: '-' },
  'set-aside': { new: 'set-aside', queued: 'set-aside', booked: '-', answered: '-', 'set-aside': '-', joined: '-' },
  'ask-detail': { new: 'new', queued: 'queued', booked: 'booked', answered: '-', 'set-aside': '-', joined: '-' },
  'to-adviser': { new: 'new', queued: 'queued', booked: 'booked', answered: '-', 'set-aside': '-', joined: '-' },
  book: { new: 'booked', queued: 'booked', booked: '-', answered: '-', 'set-aside': '-', joined: '-' },
  answer: { new: 'booked', queued: 'booked', booked: 'booked', answered: '-', 'set-aside': '-', joined: '-' },
  publish: { new: '-', queued: '-', booked: 'answered', answered: '-', 'set-aside': '-', joined: '-' },
  return: { new: '-', queued: '-', booked: 'queued', answered: '-', 'set-aside': '-', joined: '-' },
  reopen: { new: '-', queued: '-', booked: '-', answered: 'queued', 'set-aside': '-', joined: '-' },
}

describe('the state machine of a question', () => {
  for (const move of questionMoves)
    it(`moves by “${move}” as the table says`, () => {
      for (const state of questionStates)
        expect([state, afterMove(state, move) ?? '-']).toEqual([state, table[move][state]])
    })

  it('offers the desk exactly the moves that are allowed', () => {
    expect(deskMovesIn('new')).toEqual(['book', 'queue', 'join', 'ask-detail', 'to-adviser', 'set-aside'])
    expect(deskMovesIn('queued')).toEqual(['book', 'join', 'ask-detail', 'to-adviser', 'set-aside'])
    expect(deskMovesIn('booked')).toEqual(['queue', 'ask-detail', 'to-adviser'])
    expect(deskMovesIn('joined')).toEqual(['queue'])
    expect(deskMovesIn('set-aside')).toEqual(['queue'])
    expect(deskMovesIn('answered')).toEqual([])
  })

  it('leads every open question to an answer without passing through a closed state', () => {
    const reached = (['book', 'answer', 'publish'] as const).reduce<QuestionState | null>(
      (state, move) => state && afterMove(state, move),
      'new',
    )
    // Booked and then answered at the minute: `answer` leaves it booked until its episode is published.
    expect(reached).toBe('answered')
    expect(questionStates.filter(isOpen)).toEqual(['new', 'queued', 'booked'])
  })

  it('says of every state why a move is refused', () => {
    for (const state of questionStates) expect(refusal(state)).toMatch(/^The question is .+\.$/)
  })
})
