export type FieldError = { path: string; message: string }

type Extra = { errors?: FieldError[]; headers?: Record<string, string>; also?: Record<string, unknown> }

/** An expected refusal, told to the caller as RFC 9457 problem+json. */
export class Problem extends Error {
  readonly errors?: FieldError[]
  readonly headers: Record<string, string>
  /** Members beside the standard ones, such as the current state with a 412. */
  readonly also: Record<string, unknown>

  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail: string,
    { errors, headers = {}, also = {} }: Extra = {},
  ) {
    super(`${status} ${title}: ${detail}`)
    this.errors = errors
    this.headers = headers
    this.also = also
  }
}

export const malformed = (detail: string, errors?: FieldError[]) => new Problem(400, 'Malformed', detail, { errors })
export const signInNeeded = () =>
  new Problem(401, 'Not signed in', 'Sign in first.', { headers: { 'WWW-Authenticate': 'Bearer' } })
export const forbidden = (detail = 'Your role does not allow this.') => new Problem(403, 'Not allowed', detail)
export const notFound = (what = 'This') =>
  new Problem(404, 'Not found', `${what} does not exist, or is not visible to you.`)
export const conflict = (detail: string, also?: Record<string, unknown>) =>
  new Problem(409, 'Not possible now', detail, { also })
/** @param current what stands now, so that the caller can show both versions */
export const stale = (current: unknown) =>
  new Problem(412, 'Changed meanwhile', 'Somebody saved a newer version. Nothing of it was overwritten.', {
    also: { current },
  })
export const editionNeeded = () =>
  new Problem(428, 'If-Match needed', 'Send the ETag you read as If-Match, so that nobody is overwritten unseen.')
export const tooLarge = (detail: string) => new Problem(413, 'Too large', detail)
export const wrongType = (detail: string) => new Problem(415, 'Type not taken', detail)
export const unprocessable = (detail: string, errors?: FieldError[], also?: Record<string, unknown>) =>
  new Problem(422, 'Against a rule', detail, { errors, also })
export const tooMany = (seconds: number) =>
  new Problem(429, 'Too many', `Try again in ${seconds} seconds.`, { headers: { 'Retry-After': String(seconds) } })
export const unavailable = (what: string, seconds = 5) =>
  new Problem(503, 'Not available', `${what} does not answer just now. Nothing was lost; try again shortly.`, {
    headers: { 'Retry-After': String(seconds) },
  })
