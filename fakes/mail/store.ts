import { randomUUID } from 'node:crypto'
import { mkdirSync } from 'node:fs'
import { open, readFile, truncate } from 'node:fs/promises'
import { join } from 'node:path'
import type { Letter, ReadLetter } from './letter'

type Line = { letter: Letter } | { copyOf: string }

export type LetterStore = {
  /** Resolves once the letter is on the disk: only then may the SMTP server say 250. */
  deliver(to: string, letter: ReadLetter): Promise<void>
  /** Newest first; with `to`, one person's mailbox. */
  letters(to?: string): Letter[]
  letter(id: string): Letter | undefined
  empty(): Promise<void>
}

/** A kill in mid-write leaves half a last line; it was never acknowledged, so it is cut off before the next is added. */
async function linesKept(path: string): Promise<Line[]> {
  const bytes = await readFile(path).catch(() => Buffer.alloc(0))
  const end = bytes.lastIndexOf(0x0a) + 1
  if (end < bytes.length) await truncate(path, end)
  return bytes
    .subarray(0, end)
    .toString('utf8')
    .split('\n')
    .filter(Boolean)
    .map((line) => JSON.parse(line) as Line)
}

/** Letters in an append-only file of JSON lines under `directory`. One process writes; deliveries queue behind each other. */
export async function openLetterStore(directory: string): Promise<LetterStore> {
  mkdirSync(directory, { recursive: true })
  const path = join(directory, 'letters.jsonl')
  const byId = new Map<string, Letter>()
  const byMessage = new Map<string, Letter>()
  const key = (to: string, messageId: string) => `${to}\n${messageId}`

  const take = (line: Line) => {
    if ('copyOf' in line) {
      const known = byId.get(line.copyOf)
      if (known) known.copies += 1
      return
    }
    byId.set(line.letter.id, line.letter)
    byMessage.set(key(line.letter.to, line.letter.messageId), line.letter)
  }
  const append = async (line: Line) => {
    const file = await open(path, 'a', 0o600)
    try {
      await file.writeFile(`${JSON.stringify(line)}\n`)
      await file.sync()
    } finally {
      await file.close()
    }
    take(line)
  }

  for (const line of await linesKept(path)) take(line)
  let last: Promise<unknown> = Promise.resolve()
  const inTurn = (work: () => Promise<void>) => {
    const turn = last.then(work)
    last = turn.catch(() => undefined)
    return turn
  }

  return {
    deliver: (to, letter) =>
      inTurn(async () => {
        const known = byMessage.get(key(to, letter.messageId))
        if (known) return append({ copyOf: known.id })
        return append({ letter: { id: randomUUID(), to, ...letter, receivedAt: new Date().toISOString(), copies: 1 } })
      }),
    letters: (to) => [...byId.values()].filter((letter) => !to || letter.to === to.toLowerCase()).reverse(),
    letter: (id) => byId.get(id),
    empty: () =>
      inTurn(async () => {
        await truncate(path).catch(() => undefined)
        byId.clear()
        byMessage.clear()
      }),
  }
}
