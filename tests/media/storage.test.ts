import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { Readable } from 'node:stream'
import { text } from 'node:stream/consumers'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { diskStorage } from '@/media/disk'
import { opensFolder, signFolder } from '@/media/sign'
import { NameTaken, type Storage } from '@/media/storage'

let root: string
let storage: Storage
beforeAll(async () => {
  root = await mkdtemp(join(tmpdir(), 'storage-'))
  storage = diskStorage(join(root, 'media'))
})
afterAll(() => rm(root, { recursive: true }))

describe('storage on disk', () => {
  it('gives back what was put, whole or in part', async () => {
    await storage.put('films/a/master.m3u8', Readable.from(['#EXTM3U', '\n', 'rest']))
    expect(await text(await storage.open('films/a/master.m3u8'))).toBe('#EXTM3U\nrest')
    expect(await text(await storage.open('films/a/master.m3u8', { first: 1, last: 6 }))).toBe('EXTM3U')
    expect(await storage.stat('films/a/master.m3u8')).toMatchObject({ bytes: 12 })
  })

  it('never overwrites a name, and leaves nothing of the attempt', async () => {
    await storage.put('films/b/one', Buffer.from('first'))
    await expect(storage.put('films/b/one', Buffer.from('second'))).rejects.toBeInstanceOf(NameTaken)
    expect(await text(await storage.open('films/b/one'))).toBe('first')
    expect(await storage.list('films/b')).toEqual(['one'])
  })

  it('shows no name whose bytes broke off', async () => {
    const broken = Readable.from(
      (async function* () {
        yield 'half'
        throw new Error('line lost')
      })(),
    )
    await expect(storage.put('films/c/one', broken)).rejects.toThrow('line lost')
    expect(await storage.stat('films/c/one')).toBeNull()
    expect(await readdir(join(root, 'media', 'films', 'c'))).toEqual([])
  })

  it('takes over a finished file under its name', async () => {
    const from = join(root, 'incoming')
    await writeFile(from, 'as filmed')
    await storage.adopt('uploads/f1', from)
    expect(await text(await storage.open('uploads/f1'))).toBe('as filmed')
    expect(await readdir(root)).toEqual(['media'])
  })

  it.each([
    '../secret',
    'films/../../x',
    '/etc/passwd',
    'films//x',
    'films/.hidden',
    'a\\..\\b',
    'x\0y',
    'films/%2e%2e/x',
    '',
  ])('has no name %j', (name) => expect(() => storage.localPath(name)).toThrow())

  it('knows a folder from a file, and forgives removing what is not there', async () => {
    expect(await storage.stat('films/a')).toBeNull()
    await storage.remove('films/a')
    await storage.remove('films/a')
    expect(await storage.stat('films/a/master.m3u8')).toBeNull()
    expect(await storage.list('films/nowhere')).toEqual([])
  })
})

describe('a signed folder', () => {
  const secret = 'a secret of more than thirty-two characters'
  const until = new Date('2026-05-01T12:00:00Z')
  const before = new Date('2026-05-01T11:59:59Z')
  const token = signFolder('f1', until, secret)

  it('opens until its time and no longer', () => {
    expect(opensFolder(token, 'f1', before, secret)).toBe(true)
    expect(opensFolder(token, 'f1', until, secret)).toBe(false)
  })

  it('opens no other folder, with no other secret, and not when anything in it was changed', () => {
    expect(opensFolder(token, 'f2', before, secret)).toBe(false)
    expect(opensFolder(token, 'f1', before, `${secret}x`)).toBe(false)
    const [expiry = '', digest = ''] = token.split('.')
    const later = (Number.parseInt(expiry, 36) + 60).toString(36)
    for (const forged of [`${later}.${digest}`, expiry, `${expiry}.`, `.${digest}`, `${token}.x`, '', 'zz.zz']) {
      expect(opensFolder(forged, 'f1', before, secret), forged).toBe(false)
    }
  })
})
