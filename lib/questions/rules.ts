/** Where a question stands. `new`: nobody at the desk has looked yet. */
export const questionStates = ['new', 'queued', 'booked', 'answered', 'set-aside', 'joined'] as const
export type QuestionState = (typeof questionStates)[number]

/** What can be done with a question. `publish`, `return` and `reopen` follow from a publication or an asker's verdict. */
export const questionMoves = [
  'queue',
  'join',
  'set-aside',
  'ask-detail',
  'to-adviser',
  'book',
  'answer',
  'publish',
  'return',
  'reopen',
] as const
export type QuestionMove = (typeof questionMoves)[number]

type Transition = {
  /** States in which the move is allowed; also the WHERE clause that makes one of two simultaneous moves lose. */
  from: readonly QuestionState[]
  /** The state after it; `same` for moves that only leave a trace. */
  to: QuestionState | 'same'
}

/**
 * The one state machine. A joined question goes with the one it is joined to, so it can only be taken out again.
 * An answer may be written before anybody queued or booked: it books. On an answered question it is mended, and nobody
 * gets a second letter for that.
 */
export const transitions: Record<QuestionMove, Transition> = {
  queue: { from: ['new', 'set-aside', 'joined', 'booked'], to: 'queued' },
  join: { from: ['new', 'queued'], to: 'joined' },
  'set-aside': { from: ['new', 'queued'], to: 'set-aside' },
  'ask-detail': { from: ['new', 'queued', 'booked'], to: 'same' },
  'to-adviser': { from: ['new', 'queued', 'booked'], to: 'same' },
  book: { from: ['new', 'queued'], to: 'booked' },
  answer: { from: ['new', 'queued', 'booked'], to: 'booked' },
  publish: { from: ['booked'], to: 'answered' },
  return: { from: ['booked'], to: 'queued' },
  reopen: { from: ['answered'], to: 'queued' },
}

/** States that wait for an answer. */
export const openStates: readonly QuestionState[] = ['new', 'queued', 'booked']

export const isOpen = (state: QuestionState): boolean => openStates.includes(state)

/** The state after a move, or null when the state does not allow it. */
export function afterMove(state: QuestionState, move: QuestionMove): QuestionState | null {
  const { from, to } = transitions[move]
  if (!from.includes(state)) return null
  return to === 'same' ? state : to
}

/** What the desk can do with a question that stands like this, in the order of the buttons. */
export const deskMovesIn = (state: QuestionState): QuestionMove[] =>
  (['book', 'queue', 'join', 'ask-detail', 'to-adviser', 'set-aside'] as const).filter((move) =>
    transitions[move].from.includes(state),
  )

/** How a state is said on the screen. */
export const stateWord: Record<QuestionState, string> = {
  new: 'New',
  queued: 'In the queue',
  booked: 'Booked for a coming episode',
  answered: 'Answered',
  'set-aside': 'Set aside',
  joined: 'Joined to another question',
}

/** Why a move was refused: what the question is now, and what to do about it. */
export function refusal(state: QuestionState): string {
  const how: Record<QuestionState, string> = {
    new: 'The question is new.',
    queued: 'The question is in the queue already.',
    booked: 'The question is booked for an episode. Take it back to the queue first.',
    answered: 'The question is answered. It opens again when an asker says that it is not settled.',
    'set-aside': 'The question is set aside. Put it in the queue first.',
    joined: 'The question is joined to another one. Put it in the queue first.',
  }
  return how[state]
}
