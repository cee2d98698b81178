import { randomBytes } from 'node:crypto'
import { createReadStream } from 'node:fs'
import { link, mkdir, open, readdir, rm, stat, unlink } from 'node:fs/promises'
import { dirname, join, resolve, sep } from 'node:path'
import type { Readable } from 'node:stream'
import { sync } from './files'
import { NameTaken, safeName, type Storage, type Stored } from './storage'

/** Storage on this machine's own disk, below one root. */
export function diskStorage(root: string): Storage {
  const base = resolve(root)
  const localPath = (name: string): string => {
    const path = join(base, safeName(name))
    // safeName lets nothing through that could leave; this holds even if it ever does.
    if (!path.startsWith(base + sep)) throw new Error('Outside the storage folder')
    return path
  }
  return {
    localPath,
    put: (name, bytes) => put(name, localPath(name), bytes),
    adopt: (name, path) => adopt(name, localPath(name), path),
    stat: (name) => describe(localPath(name)),
    open: async (name, range) => {
      const file = await open(localPath(name), 'r')
      return createReadStream('', { fd: file, ...(range ? { start: range.first, end: range.last } : {}) })
    },
    remove: (name) => rm(localPath(name), { recursive: true, force: true }),
    list: (folder) => readdir(localPath(folder)).then((names) => names.sort(), absent([])),
  }
}

const absent =
  <T>(value: T) =>
  (error: NodeJS.ErrnoException): T => {
    if (error.code === 'ENOENT' || error.code === 'ENOTDIR') return value
    throw error
  }

async function describe(path: string): Promise<Stored | null> {
  const found = await stat(path).catch(absent(null))
  if (!found?.isFile()) return null
  // Names are immutable, so size and time of writing tell one content from any other.
  const etag = `"${found.size.toString(36)}-${Math.floor(found.mtimeMs).toString(36)}"`
  return { bytes: found.size, modifiedAt: found.mtime, etag }
}

async function put(name: string, path: string, bytes: Readable | Uint8Array): Promise<Stored> {
  const unfinished = `${path}.${randomBytes(6).toString('hex')}.part`
  await mkdir(dirname(path), { recursive: true })
  try {
    const file = await open(unfinished, 'wx')
    try {
      // On a file handle this goes on from where the last one ended.
      if (bytes instanceof Uint8Array) await file.writeFile(bytes)
      else for await (const chunk of bytes) await file.writeFile(chunk as Buffer)
      await file.sync()
    } finally {
      await file.close()
    }
    return await take(name, path, unfinished)
  } finally {
    await rm(unfinished, { force: true })
  }
}

async function adopt(name: string, path: string, from: string): Promise<Stored> {
  await mkdir(dirname(path), { recursive: true })
  await sync(from)
  const stored = await take(name, path, from)
  await unlink(from)
  return stored
}

/** A link, unlike a rename, fails when the name is taken: two writers cannot both believe that theirs stands. */
async function take(name: string, path: string, from: string): Promise<Stored> {
  try {
    await link(from, path)
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'EEXIST') throw new NameTaken(name)
    throw error
  }
  await sync(dirname(path))
  const stored = await describe(path)
  if (!stored) throw new Error(`${name} vanished while it was stored`)
  return stored
}
