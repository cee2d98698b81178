import { readdirSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { routes } from '@/app/api/openapi.json/routes'
import { describeApi } from '@/lib/http/openapi'

/** Served by libraries that bring their own description: next-auth, tus. */
const described = new Set(['/api/auth/{nextauth}', '/api/footage/{upload}', '/api/{nothing}'])

const addressOf = (file: string) =>
  `/api/${file.replace(/\/?route\.ts$/, '')}`.replace(/\[+(?:\.\.\.)?([^\]]+)\]+/g, '{$1}')

const files = readdirSync('app/api', { recursive: true, encoding: 'utf8' }).filter((file) => file.endsWith('route.ts'))

describe('the description of the API', () => {
  it('holds every route that exists, under its own address', () => {
    const own = files.map(addressOf).filter((path) => !described.has(path) && path !== '/api/openapi.json')
    expect(Object.keys(routes).sort()).toEqual(own.sort())
  })

  it('names for every operation what it takes', () => {
    const { paths } = describeApi(routes)
    for (const [path, item] of Object.entries(paths)) {
      expect(Object.keys(item), path).not.toHaveLength(0)
      for (const name of path.matchAll(/\{(\w+)\}/g))
        for (const operation of Object.values(item) as { parameters?: { name: string; in: string }[] }[])
          expect(operation.parameters, path).toContainEqual(expect.objectContaining({ name: name[1], in: 'path' }))
    }
  })

  it('says of edits that they need If-Match', () => {
    const patch = describeApi(routes).paths['/api/episodes/{id}']?.patch
    expect(patch?.parameters).toContainEqual(expect.objectContaining({ name: 'If-Match', required: true }))
  })
})
