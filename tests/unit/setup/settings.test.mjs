import { describe, expect, it } from 'vitest'
import { isRecent } from '../../../scripts/setup/node-version.mjs'
import { healthUrl } from '../../../scripts/setup/servers.mjs'
import { environmentFor, settingsFrom } from '../../../scripts/setup/settings.mjs'
import { backoff } from '../../../scripts/setup/supervise.mjs'
import { chooseParts } from '../../../scripts/setup/test-run.mjs'

const secrets = { NEXTAUTH_SECRET: 'a', MEDIA_SECRET: 'b', SEARCH_KEY: 'c' }

describe('the settings of a start', () => {
  it('are the promised addresses where nothing is said', () => {
    const settings = settingsFrom({}, '/srv/turnrow')
    expect(settings).toMatchObject({
      host: '127.0.0.1',
      port: 3000,
      baseUrl: 'http://localhost:3000',
      databasePort: 5544,
    })
    expect(settings).toMatchObject({
      mailSmtpPort: 2525,
      mailPagePort: 2580,
      searchPort: 7700,
      dataDir: '/srv/turnrow/.data',
    })
    expect(settings.owns).toEqual({ database: true, mail: true, search: true })
  })

  it('start no stand-in for a service whose address was given', () => {
    const given = {
      DATABASE_URL: 'postgres://db.example/t',
      SMTP_URL: 'smtp://mail.example',
      SEARCH_URL: 'http://search.example',
    }
    const settings = settingsFrom(given, '/srv/turnrow')
    expect(settings.owns).toEqual({ database: false, mail: false, search: false })
    expect(environmentFor(settings, given, given.DATABASE_URL, secrets)).toMatchObject(given)
  })

  it('fill in no demo people in a database that somebody brought, unless asked to', () => {
    expect(settingsFrom({}).demo).toBe(true)
    expect(settingsFrom({ DATABASE_URL: 'postgres://db.example/t' }).demo).toBe(false)
    expect(settingsFrom({ DATABASE_URL: 'postgres://db.example/t', DEMO: 'yes' }).demo).toBe(true)
    expect(settingsFrom({ DEMO: 'no' }).demo).toBe(false)
  })

  it('carry the port into the address, and an empty variable counts as unset', () => {
    expect(settingsFrom({ PORT: '4100', BASE_URL: '' }).baseUrl).toBe('http://localhost:4100')
    expect(settingsFrom({ PORT: '4100', BASE_URL: 'https://farm.example/' })).toMatchObject({
      port: 4100,
      baseUrl: 'https://farm.example',
    })
    expect(environmentFor(settingsFrom({}), { SMTP_URL: '' }, 'postgres://x', secrets).SMTP_URL).toBe(
      'smtp://127.0.0.1:2525',
    )
  })

  it('refuse what is no port with a sentence that names the variable', () => {
    for (const PORT of ['0', '65536', '80.5', 'web'])
      expect(() => settingsFrom({ PORT })).toThrow(/PORT must be a port number/)
  })

  it('let what the person has set win over our own secrets', () => {
    expect(
      environmentFor(settingsFrom({}), { NEXTAUTH_SECRET: 'theirs' }, 'postgres://x', secrets).NEXTAUTH_SECRET,
    ).toBe('theirs')
  })
})

it('asks for health on loopback where the web listens on every address', () => {
  expect(healthUrl({ host: '0.0.0.0', port: 1 })).toBe('http://127.0.0.1:1/api/health')
  expect(healthUrl({ host: '::1', port: 1 })).toBe('http://[::1]:1/api/health')
  expect(healthUrl({ host: '192.0.2.7', port: 1 })).toBe('http://192.0.2.7:1/api/health')
})

it('tells an old Node from one that will do', () => {
  expect(['20.19.0', '20.20.2', '22.1.0', '100.0.0'].map(isRecent)).toEqual([true, true, true, true])
  expect(['20.18.9', '18.20.0', '9.99.0'].map(isRecent)).toEqual([false, false, false])
})

it('waits longer after every end in a row, but never longer than a quarter of a minute', () => {
  expect([0, 1, 2, 3].map(backoff)).toEqual([100, 500, 1000, 2000])
  expect(backoff(40)).toBe(15_000)
})

it('runs the parts asked for in their own order and refuses a name that is none', () => {
  expect(chooseParts(['e2e', 'unit']).map((part) => part.name)).toEqual(['unit', 'e2e'])
  expect(chooseParts([]).map((part) => part.name)).toEqual([
    'format',
    'lint',
    'types',
    'unit',
    'service',
    'media',
    'build',
    'e2e',
  ])
  expect(() => chooseParts(['units'])).toThrow('There is no part "units"')
})
