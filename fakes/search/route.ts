import type { Json } from './shapes'
import type { Store } from './store'
import type { Tasks } from './tasks'

export type Call = { store: Store; tasks: Tasks; params: string[]; query: URLSearchParams; body: unknown }
export type Answer = { status?: number; body: Json }

/** One call of the API. `:name` in a path stands for one segment; they come in order as `params`. */
export type Route = { method: string; path: string; open?: true; answer: (call: Call) => Answer }

/** A write is answered before it is done. */
export const accepted = (body: Json): Answer => ({ status: 202, body })

/** The route of a request and its parameters, or null. */
export function routeFor(routes: Route[], method: string, path: string): { route: Route; params: string[] } | null {
  const segments = path.replace(/\/$/, '').split('/')
  for (const route of routes) {
    const pattern = route.path.split('/')
    const fits =
      route.method === method &&
      pattern.length === segments.length &&
      pattern.every((part, at) => part.startsWith(':') || part === segments[at])
    if (fits) {
      const params = segments.filter((_, at) => pattern[at]?.startsWith(':'))
      return { route, params: params.map(decodeURIComponent) }
    }
  }
  return null
}
