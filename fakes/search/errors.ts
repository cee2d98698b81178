/** An error as Meilisearch's HTTP API words it: `code` is what a client branches on. */
export class SearchError extends Error {
  constructor(
    readonly status: number,
    readonly code: string,
    message: string,
    readonly type: 'invalid_request' | 'auth' | 'internal' = 'invalid_request',
  ) {
    super(message)
  }
}

export type ErrorBody = { message: string; code: string; type: string; link: string }

/** The body of an answer or the `error` of a task. */
export function errorBody(error: unknown): ErrorBody {
  const known = error instanceof SearchError ? error : new SearchError(500, 'internal', String(error), 'internal')
  return { message: known.message, code: known.code, type: known.type, link: '' }
}

export const indexNotFound = (uid: string) => new SearchError(404, 'index_not_found', `Index \`${uid}\` not found.`)
export const badRequest = (message: string, code = 'bad_request') => new SearchError(400, code, message)
