/** What an endpoint may give back beside a plain object (JSON, 200). */
export class Answer {
  constructor(
    readonly status: number,
    readonly body: unknown,
    readonly headers: Record<string, string> = {},
  ) {}
}

export const etagOf = (edition: number) => `"${edition}"`

/** 201 with the new thing, its address and, where it can be edited, its ETag. */
export const created = (body: unknown, { location, edition }: { location?: string; edition?: number } = {}) =>
  new Answer(201, body, {
    ...(location ? { Location: location } : {}),
    ...(edition === undefined ? {} : { ETag: etagOf(edition) }),
  })

/** 200 with the ETag that an edit has to send back. */
export const tagged = (body: unknown, edition: number) => new Answer(200, body, { ETag: etagOf(edition) })
export const accepted = (body: unknown) => new Answer(202, body)
export const noContent = () => new Answer(204, null)

/** A text of a named type, such as text/vtt. */
export const text = (body: string, type: string, headers: Record<string, string> = {}) =>
  new Response(body, { headers: { 'Content-Type': `${type}; charset=utf-8`, ...headers } })
