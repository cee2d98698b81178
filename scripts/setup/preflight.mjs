import { accessSync, constants, existsSync, mkdirSync, statfsSync } from 'node:fs'
import path from 'node:path'
import { mustBeFree } from './ports.mjs'
import { clusterRuns } from './postgres.mjs'
import { Trouble } from './trouble.mjs'

const mega = 1024 ** 2

/** Throws one sentence where the folder cannot be written or the disk has too little room for what is still to be made. */
export function mustHaveRoom({ root, dataDir }) {
  try {
    accessSync(root, constants.W_OK)
    mkdirSync(dataDir, { recursive: true })
    accessSync(dataDir, constants.W_OK)
  } catch (error) {
    if (error.code === 'ENOSPC') throw error
    throw new Trouble(`${error.path ?? root} cannot be written by this user; start as the owner of this folder.`)
  }
  const hasModules = existsSync(path.join(root, 'node_modules/.package-lock.json'))
  const needs = [
    [root, hasModules ? 200 : 1800],
    [dataDir, 300],
  ]
  for (const [folder, needed] of needs) {
    const { bavail, bsize } = statfsSync(folder)
    const free = Math.floor((bavail * bsize) / mega)
    if (free < needed)
      throw new Trouble(
        `The disk is nearly full: ${folder} has ${free} MB free and ${needed} MB are needed. Make room and start again.`,
      )
  }
}

/** Throws one sentence for the first port that is taken, before anything is begun. */
export async function portsMustBeFree(settings) {
  const { host, port, owns, databasePort, mailSmtpPort, mailPagePort, searchPort, dataDir } = settings
  await mustBeFree(port, { host, what: 'the web', setting: 'PORT' })
  if (owns.database && !clusterRuns(path.join(dataDir, 'postgres')))
    await mustBeFree(databasePort, { what: 'the database', setting: 'DATABASE_PORT' })
  if (owns.mail) {
    await mustBeFree(mailSmtpPort, { what: 'the mail stand-in', setting: 'MAIL_SMTP_PORT' })
    await mustBeFree(mailPagePort, { what: 'the mailbox page', setting: 'MAIL_PAGE_PORT' })
  }
  if (owns.search) await mustBeFree(searchPort, { what: 'the search stand-in', setting: 'SEARCH_PORT' })
}
