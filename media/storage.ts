import type { Readable } from 'node:stream'

export type Stored = { bytes: number; modifiedAt: Date; etag: string }

/**
 * Where bytes live: `uploads/<footage>` as filmed, `films/<folder>/…` as served. Names are relative, with `/` between parts;
 * once written a name keeps its bytes for ever, so what is read can be cached for ever.
 */
export interface Storage {
  /** Writes a new name; it appears whole or not at all. @throws NameTaken when it exists */
  put(name: string, bytes: Readable | Uint8Array): Promise<Stored>
  /** Takes over a file that is already complete on this machine, without copying where that can be had. @throws NameTaken */
  adopt(name: string, path: string): Promise<Stored>
  stat(name: string): Promise<Stored | null>
  /** The bytes of a name, or a stretch of them (inclusive ends). @throws when there is no such name */
  open(name: string, range?: { first: number; last: number }): Promise<Readable>
  /** Removes a name, or everything below it. Absent is fine. */
  remove(name: string): Promise<void>
  /** Names directly below a folder. */
  list(folder: string): Promise<string[]>
  /** A path on this machine at which ffmpeg can read the name, or write a folder of that name. */
  localPath(name: string): string
}

export class NameTaken extends Error {
  constructor(readonly storedName: string) {
    super(`There already is ${storedName}`)
  }
}

export class UnsafeName extends Error {}

const part = /^[A-Za-z0-9][A-Za-z0-9_.-]{0,120}$/

/** Parts are letters, digits, dot, dash and underscore and never begin with a dot: no traversal, no hidden files, no surprises. */
export function safeName(name: string): string {
  const parts = name.split('/')
  if (parts.length > 6 || !parts.every((text) => part.test(text))) throw new UnsafeName('Not a stored name')
  return name
}
