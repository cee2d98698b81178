import { closeSync, fsyncSync, mkdirSync, openSync, readFileSync, renameSync, rmSync, writeSync } from 'node:fs'
import { join } from 'node:path'

/** JSON files of one folder. A file is either as it was or as it is to be: written beside it, then renamed over it. */
export type Disk = {
  read(name: string): unknown
  write(name: string, value: unknown): void
  remove(name: string): void
}

function writeWhole(path: string, text: string) {
  const file = openSync(path, 'w', 0o600)
  try {
    const bytes = Buffer.from(text)
    for (let at = 0; at < bytes.length;) at += writeSync(file, bytes, at)
    fsyncSync(file)
  } finally {
    closeSync(file)
  }
}

/** Opens the folder, making it where it is missing. */
export function openDisk(directory: string): Disk {
  mkdirSync(directory, { recursive: true })
  const path = (name: string) => join(directory, `${name}.json`)
  return {
    read(name) {
      try {
        return JSON.parse(readFileSync(path(name), 'utf8')) as unknown
      } catch (error) {
        if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null
        throw error
      }
    },
    write(name, value) {
      writeWhole(`${path(name)}.new`, JSON.stringify(value))
      renameSync(`${path(name)}.new`, path(name))
    },
    remove: (name) => rmSync(path(name), { force: true }),
  }
}
