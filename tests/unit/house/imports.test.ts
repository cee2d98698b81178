import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'

/**
 * Who may import whom (DEVELOPERS.md, "Who may import whom"). Patterns over paths from the root; `types` marks what may
 * be had as a type only.
 */
type Rule = { of: RegExp; may: RegExp[]; types?: RegExp[] }

const browserSafe =
  /^lib\/[\w-]+\/((?:[\w-]+-)?(schema|rules|views|hooks|actions)|way-back|parse|when|limits|stage-words|crops|cautions|client|actor)$/
const libFree = /^lib\/(env|errors|clock|log)$/
/** Files of media that start no process: what a request may use. */
const mediaPure = /^media\/(sign|ranges|cues|webvtt|srt|caption-file|storage|failure|files|photos)$/
const jobBody =
  /^lib\/[\w-]+\/(inspect|encode|reconcile|refresh|hear|load|publish|send|rebuild|draw|seed|sweep)-[\w-]+$/

const rules: Record<string, Rule> = {
  app: { of: /^app\//, may: [/^app\//, /^components\//, /^lib\//] },
  components: { of: /^components\//, may: [/^components\//, browserSafe, /^lib\/topics\//], types: [/^lib\//] },
  media: { of: /^media\//, may: [/^media\//, libFree] },
  fakes: { of: /^fakes\//, may: [/^fakes\//], types: [/^media\/storage$/] },
  migrations: { of: /^migrations\//, may: [/^migrations\//] },
  models: { of: /^models\//, may: [/^models\//, /^lib\/db$/, /^lib\/[\w-]+\/(rules|stage-words|crops)$/] },
  'job bodies': { of: jobBody, may: [/^lib\//, /^models\//, /^media\//] },
  services: { of: /^lib\/services$/, may: [/^lib\//, /^media\//] },
  demo: { of: /^lib\/demo\//, may: [/^lib\//, /^models\//, /^media\//] },
  lib: { of: /^lib\//, may: [/^lib\//, /^models\//, mediaPure] },
}

const sources = ['app', 'components', 'lib', 'models', 'migrations', 'media', 'fakes'].flatMap((folder) =>
  readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((file) => /(?<!\.d)\.tsx?$/.test(file))
    .map((file) => `${folder}/${file}`),
)

type Import = { to: string; typeOnly: boolean }

function importsOf(file: string): Import[] {
  const text = readFileSync(file, 'utf8')
  const found = text.matchAll(
    /(?:^|\n)\s*(?:import|export)\s+(type\s)?(?:[^'"]*?from\s*)?['"]([^'"]+)['"]|import\(\s*['"]([^'"]+)['"]\s*\)/g,
  )
  return [...found].flatMap((match) => {
    const name = match[2] ?? match[3] ?? ''
    if (name.startsWith('@/')) return [{ to: name.slice(2), typeOnly: Boolean(match[1]) }]
    if (!name.startsWith('.')) return []
    return [{ to: path.posix.join(path.posix.dirname(file), name), typeOnly: Boolean(match[1]) }]
  })
}

function ruleOf(file: string): Rule | undefined {
  const place = file.replace(/\.tsx?$/, '')
  return Object.values(rules).find(({ of }) => of.test(place))
}

const broken = sources.flatMap((file) => {
  const rule = ruleOf(file)
  return importsOf(file)
    .filter(({ to, typeOnly }) => {
      if (rule?.may.some((pattern) => pattern.test(to))) return false
      return !(typeOnly && rule?.types?.some((pattern) => pattern.test(to)))
    })
    .map(({ to }) => `${file} imports ${to}`)
})

describe('the house', () => {
  it('has files to look at', () => expect(sources.length).toBeGreaterThan(200))

  it('lets nobody import across its table', () => expect(broken).toEqual([]))

  it('keeps what the browser loads free of anything that opens a connection', () => {
    const safe = sources.filter((file) => /^lib\/[\w-]+\/(?:[\w-]+-)?(schema|rules|views|hooks)\.tsx?$/.test(file))
    const leaks = safe.flatMap((file) =>
      importsOf(file)
        .filter(
          ({ to, typeOnly }) =>
            !typeOnly && /^(models\/|media\/(?!cues)|lib\/(db|services|env)$|lib\/[\w-]+\/(reads|writes)$)/.test(to),
        )
        .map(({ to }) => `${file} imports ${to}`),
    )
    expect(leaks).toEqual([])
  })

  it('has no cycle between the domains of lib', () => {
    expect(cyclesIn(sources.filter((file) => file.startsWith('lib/')))).toEqual([])
  })
})

/** Files that reach themselves through imports of values. */
function cyclesIn(files: string[]): string[] {
  const known = new Map(files.map((file) => [file.replace(/\.tsx?$/, ''), file]))
  const edges = new Map(
    [...known].map(([place, file]) => [
      place,
      importsOf(file)
        .filter(({ to, typeOnly }) => !typeOnly && known.has(to))
        .map(({ to }) => to),
    ]),
  )
  const state = new Map<string, 'open' | 'done'>()
  const found: string[] = []
  const visit = (place: string, trail: string[]) => {
    if (state.get(place) === 'done') return
    if (state.get(place) === 'open') return void found.push([...trail.slice(trail.indexOf(place)), place].join(' → '))
    state.set(place, 'open')
    for (const next of edges.get(place) ?? []) visit(next, [...trail, place])
    state.set(place, 'done')
  }
  for (const place of known.keys()) visit(place, [])
  return found
}
