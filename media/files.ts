import { open, readdir } from 'node:fs/promises'
import { join } from 'node:path'

/** Brings one file's or folder's bytes to the disk. Only then is a name that points at it worth anything after a power cut. */
export async function sync(path: string): Promise<void> {
  const file = await open(path, 'r')
  try {
    await file.sync()
  } finally {
    await file.close()
  }
}

/** Every file below a folder, as paths relative to it with `/` between. */
export async function filesBelow(folder: string): Promise<string[]> {
  const found = await readdir(folder, { withFileTypes: true, recursive: true })
  return found
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1))
    .sort()
}

/** Files first, then the folders from the inside out, so that no synced folder names an unsynced file. */
export async function syncTree(folder: string): Promise<void> {
  const found = await readdir(folder, { withFileTypes: true })
  for (const entry of found) {
    const path = join(folder, entry.name)
    if (entry.isDirectory()) await syncTree(path)
    else await sync(path)
  }
  await sync(folder)
}
