import { chmodSync, lstatSync, mkdirSync, mkdtempSync, readFileSync, rmSync, statSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import pg from 'pg'
import { afterEach, beforeEach, expect, it, vi } from 'vitest'
import { freePort } from '../../scripts/setup/ports.mjs'
import { clusterRuns, killCluster, startCluster } from '../../scripts/setup/postgres.mjs'

// Making a cluster with fsync takes its time on a busy disk.
vi.setConfig({ testTimeout: 180_000, hookTimeout: 60_000 })

let folder
let cluster
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'turnrow-cluster-'))
  chmodSync(folder, 0o711)
})
afterEach(async () => {
  await cluster?.stop()
  if (cluster && !cluster.home.startsWith(folder)) rmSync(cluster.home, { recursive: true })
  rmSync(folder, { recursive: true })
})

async function ask(url, sql) {
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  try {
    return (await client.query(sql)).rows
  } finally {
    await client.end()
  }
}

const serverPid = () => Number(readFileSync(path.join(cluster.home, 'data/postmaster.pid'), 'utf8').split('\n')[0])

it('keeps every acknowledged row through kill -9 and comes up again on another port', async () => {
  const directory = path.join(folder, 'postgres')
  cluster = await startCluster({ directory, port: await freePort() })
  await ask(cluster.url, 'create table kept (n int); insert into kept values (1), (2)')
  process.kill(serverPid(), 'SIGKILL')
  cluster = await startCluster({ directory, port: await freePort() })
  expect(await ask(cluster.url, 'select sum(n)::int as sum from kept')).toEqual([{ sum: 3 }])
})

it('is taken over while it runs, and after its end nothing runs', async () => {
  const options = { directory: path.join(folder, 'postgres'), port: await freePort(), durable: false }
  cluster = await startCluster(options)
  const pid = serverPid()
  expect((await startCluster(options)).url).toBe(cluster.url)
  expect(serverPid()).toBe(pid)
  await cluster.stop()
  expect(clusterRuns(options.directory)).toBe(false)
  await expect(ask(cluster.url, 'select 1')).rejects.toThrow(/ECONNREFUSED/)
})

it('asks for its password, listens on loopback alone and makes its own role no superuser', async () => {
  cluster = await startCluster({ directory: path.join(folder, 'postgres'), port: await freePort() })
  const wrong = new URL(cluster.url)
  wrong.password = 'guess'
  await expect(ask(wrong.href, 'select 1')).rejects.toThrow(/password authentication failed/)
  const sql = `select current_setting('listen_addresses') as addresses, current_setting('fsync') as fsync, rolsuper
               from pg_roles where rolname = current_user`
  expect(await ask(cluster.url, sql)).toEqual([{ addresses: '127.0.0.1', fsync: 'on', rolsuper: false }])
  expect(statSync(path.join(cluster.home, 'passwords.json')).mode & 0o077).toBe(0)
})

it('heals after a first start that was cut off half-way', async () => {
  const directory = path.join(folder, 'postgres')
  mkdirSync(path.join(directory, 'data.new/base'), { recursive: true })
  cluster = await startCluster({ directory, port: await freePort(), durable: false })
  expect(await ask(cluster.url, 'select 1 as n')).toEqual([{ n: 1 }])
})

it('lives under /var/lib where the postgres user may not walk to the project', async () => {
  // Only root hands the server to another user; anyone else runs it as themselves and reaches their own folders.
  const isRoot = process.getuid() === 0
  const hidden = path.join(folder, 'hidden')
  mkdirSync(hidden, { mode: 0o700 })
  const directory = path.join(hidden, 'postgres')
  cluster = await startCluster({ directory, port: await freePort(), durable: false })
  expect(cluster.home.startsWith('/var/lib/turnrow/')).toBe(isRoot)
  expect(lstatSync(directory).isSymbolicLink()).toBe(isRoot)
  const { url } = await startCluster({ directory, port: Number(new URL(cluster.url).port), durable: false })
  expect(url).toBe(cluster.url)
})

it('can be ended at once, and recovers', async () => {
  const options = { directory: path.join(folder, 'postgres'), port: await freePort() }
  cluster = await startCluster(options)
  await ask(cluster.url, 'create table kept (n int); insert into kept values (7)')
  killCluster(options.directory)
  cluster = await startCluster(options)
  expect(await ask(cluster.url, 'select n from kept')).toEqual([{ n: 7 }])
})
