import { randomBytes } from 'node:crypto'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { setTimeout as sleep } from 'node:timers/promises'
import pg from 'pg'
import { afterAll, beforeAll, inject } from 'vitest'
import { settingsForTests } from './settings'

async function onAdmin(sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: inject('adminUrl') })
  await client.connect()
  await client.query(sql).finally(() => client.end())
}

/** The server's own cleaning may hold a database for a moment, and only a superuser could send it away. */
async function drop(name: string, left = 40): Promise<void> {
  try {
    await onAdmin(`drop database if exists ${name} with (force)`)
  } catch (failure) {
    if (left === 0) throw failure
    await sleep(250)
    await drop(name, left - 1)
  }
}

/**
 * Gives the test file a database of its own, cloned from the migrated template, and a media folder.
 * Call it at the top of the file, before anything queries.
 */
export function freshDatabase(): void {
  const name = `turnrow_test_${randomBytes(6).toString('hex')}`
  const media = mkdtempSync(path.join(tmpdir(), 'turnrow-media-'))
  beforeAll(async () => {
    await onAdmin(`create database ${name} template ${inject('template')}`)
    const url = new URL(inject('adminUrl'))
    url.pathname = `/${name}`
    Object.assign(process.env, settingsForTests, { DATABASE_URL: url.href, MEDIA_ROOT: media })
  })
  afterAll(async () => {
    const { db } = await import('@/lib/db')
    await db().close()
    await drop(name)
    rmSync(media, { recursive: true, force: true })
  })
}
