export type FieldProblem = { path: string; message: string }

/** A refusal of our own API, as the browser sees it. */
export class ApiProblem extends Error {
  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail: string,
    readonly errors: FieldProblem[],
    readonly body: Record<string, unknown>,
  ) {
    super(detail)
  }
}

type Options = {
  method?: string
  body?: unknown
  form?: FormData
  ifMatch?: string
  idempotencyKey?: string
  signal?: AbortSignal
}

const OFFLINE = new ApiProblem(
  0,
  'No connection',
  'The line is down. What you wrote is still here; try again when it is back.',
  [],
  {},
)

function requestOf({ method, body, form, ifMatch, idempotencyKey, signal }: Options): RequestInit {
  const headers: Record<string, string> = { Accept: 'application/json' }
  if (body !== undefined) headers['Content-Type'] = 'application/json'
  if (ifMatch) headers['If-Match'] = ifMatch
  if (idempotencyKey) headers['Idempotency-Key'] = idempotencyKey
  return {
    method: method ?? 'GET',
    headers,
    body: form ?? (body === undefined ? undefined : JSON.stringify(body)),
    signal,
  }
}

/**
 * Calls our own API from the browser.
 * @throws ApiProblem with the server's words; status 0 when the line is down
 */
export async function api<T>(path: string, options: Options = {}): Promise<{ data: T; etag: string | null }> {
  const response = await fetch(path, requestOf(options)).catch((failure: unknown) => {
    if (options.signal?.aborted) throw failure
    throw OFFLINE
  })
  const body: unknown = response.status === 204 ? null : await response.json().catch(() => null)
  if (response.ok) return { data: body as T, etag: response.headers.get('etag') }
  const told = (body ?? {}) as { title?: string; detail?: string; errors?: FieldProblem[] }
  throw new ApiProblem(
    response.status,
    told.title ?? 'Failed',
    told.detail ?? 'That did not work. Please try again.',
    told.errors ?? [],
    told as Record<string, unknown>,
  )
}
