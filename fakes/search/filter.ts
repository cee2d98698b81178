import { unreadable, piecesOf, type Piece } from './filter-words'

/** What a document must be. `attribute` is checked against the filterable ones before anything is looked up. */
export type Condition =
  | { op: 'and' | 'or'; of: Condition[] }
  | { op: 'not'; of: [Condition] }
  | { op: '=' | '!=' | '>' | '>=' | '<' | '<='; attribute: string; value: string }
  | { op: 'in'; attribute: string; values: string[] }
  | { op: 'to'; attribute: string; from: string; to: string }
  | { op: 'exists' | 'null' | 'empty'; attribute: string }

class Reader {
  private at = 0
  private depth = 0
  constructor(
    private readonly filter: string,
    private readonly pieces: Piece[],
  ) {}

  whole(): Condition {
    const condition = this.either()
    if (this.at < this.pieces.length) throw this.trouble(`\`${this.pieces[this.at]?.text}\` is one too many`)
    return condition
  }

  private trouble = (why: string) => unreadable(this.filter, why)

  /** Takes the next piece when it is this operator or sign. */
  private took(text: string): boolean {
    const piece = this.pieces[this.at]
    const here =
      (piece?.kind === 'word' && piece.text.toUpperCase() === text) || (piece?.kind === 'sign' && piece.text === text)
    if (here) this.at += 1
    return here
  }

  private value(what: string): string {
    const piece = this.pieces[this.at]
    if (!piece || piece.kind === 'sign') throw this.trouble(`${what} is missing`)
    this.at += 1
    return piece.text
  }

  private either(): Condition {
    const of = [this.both()]
    while (this.took('OR')) of.push(this.both())
    return of.length === 1 && of[0] ? of[0] : { op: 'or', of }
  }

  private both(): Condition {
    const of = [this.one()]
    while (this.took('AND')) of.push(this.one())
    return of.length === 1 && of[0] ? of[0] : { op: 'and', of }
  }

  private one(): Condition {
    if (++this.depth > 200) throw this.trouble('it is nested too deeply')
    try {
      if (this.took('NOT')) return { op: 'not', of: [this.one()] }
      if (!this.took('(')) return this.condition()
      const inside = this.either()
      if (!this.took(')')) throw this.trouble('a bracket is not closed')
      return inside
    } finally {
      this.depth -= 1
    }
  }

  private condition(): Condition {
    const attribute = this.value('an attribute')
    for (const op of ['=', '!=', '>', '>=', '<', '<='] as const) {
      if (this.took(op)) return { op, attribute, value: this.value('a value') }
    }
    if (this.took('IS')) return this.state(attribute)
    const not = this.took('NOT')
    if (this.took('EXISTS')) return this.negated(not, { op: 'exists', attribute })
    if (this.took('IN')) return this.negated(not, { op: 'in', attribute, values: this.list() })
    if (not) throw this.trouble('NOT stands before EXISTS, IN or a whole condition')
    const from = this.value('an operator')
    if (!this.took('TO')) throw this.trouble(`an operator is missing after \`${attribute}\``)
    return { op: 'to', attribute, from, to: this.value('a value') }
  }

  private state(attribute: string): Condition {
    const not = this.took('NOT')
    if (this.took('NULL')) return this.negated(not, { op: 'null', attribute })
    if (this.took('EMPTY')) return this.negated(not, { op: 'empty', attribute })
    throw this.trouble('IS is followed by NULL, EMPTY, NOT NULL or NOT EMPTY')
  }

  private negated = (not: boolean, condition: Condition): Condition =>
    not ? { op: 'not', of: [condition] } : condition

  private list(): string[] {
    if (!this.took('[')) throw this.trouble('IN is followed by [')
    const values: string[] = []
    while (!this.took(']')) {
      if (values.length > 0 && !this.took(',')) throw this.trouble('a comma is missing in IN [ ]')
      if (values.length > 0 && this.took(']')) break
      values.push(this.value('a value of IN'))
    }
    return values
  }
}

/** Reads one filter expression: `AND` binds tighter than `OR`, `NOT` tighter than both. */
export function readFilter(filter: string): Condition {
  return new Reader(filter, piecesOf(filter)).whole()
}
