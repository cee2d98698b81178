import { execFileSync } from 'node:child_process'
import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import pg from 'pg'
import type { TestProject } from 'vitest/node'
import { freePorts } from './free-ports'
import { settingsForTests } from './settings'

declare module 'vitest' {
  interface ProvidedContext {
    adminUrl: string
    template: string
  }
}

type Cluster = { url: string; stop: () => Promise<void> | void }

/** The cluster that `npm test` has started, or one of our own. */
async function someCluster(): Promise<Cluster> {
  const given = process.env.TEST_DATABASE_URL
  if (given) return { url: given, stop: () => undefined }
  const { startCluster } = await import('../../scripts/setup/postgres.mjs')
  const directory = mkdtempSync(path.join(tmpdir(), 'turnrow-service-'))
  const [port = 0] = await freePorts(1)
  const cluster = await startCluster({ directory, port, durable: false })
  return {
    url: cluster.url,
    stop: async () => {
      await cluster.stop()
      rmSync(directory, { recursive: true, force: true })
    },
  }
}

async function onAdmin(url: string, sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  await client.query(sql).finally(() => client.end())
}

/** Migrates one template database; every service test gets a clone of it in a fraction of a second. */
export default async function setup(project: TestProject) {
  const cluster = await someCluster()
  const template = `turnrow_template_${process.pid}`
  await onAdmin(cluster.url, `create database ${template}`)
  const url = new URL(cluster.url)
  url.pathname = `/${template}`
  execFileSync(process.execPath, ['--import', 'tsx', 'scripts/migrate.ts', 'up'], {
    env: { ...process.env, ...settingsForTests, DATABASE_URL: url.href },
    stdio: ['ignore', 'ignore', 'inherit'],
  })
  project.provide('adminUrl', cluster.url)
  project.provide('template', template)
  return async () => {
    await onAdmin(cluster.url, `drop database if exists ${template} with (force)`)
    await cluster.stop()
  }
}
