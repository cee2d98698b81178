import { z } from 'zod'
import type { Endpoint, EndpointSpec } from './endpoint'

/** Route modules by address, `/api/episodes/{id}`: what they export under the names of HTTP's methods. */
export type Routes = Record<string, object>

const METHODS = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const

type Parameter = {
  name: string
  in: 'path' | 'query' | 'header'
  required: boolean
  schema: object
  description?: string
}

const jsonSchema = (schema: z.ZodType, io: 'input' | 'output') =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any' }) as { properties?: Record<string, object>; required?: string[] }

function parametersFrom(schema: z.ZodType | undefined, place: 'path' | 'query'): Parameter[] {
  if (!schema) return []
  const { properties = {}, required = [] } = jsonSchema(schema, 'input')
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
  }))
}

function headersOf({ edition, creates }: EndpointSpec<unknown, unknown, unknown>): Parameter[] {
  const text = { type: 'string' }
  return [
    ...(edition
      ? [
          {
            name: 'If-Match',
            in: 'header' as const,
            required: edition === true,
            schema: text,
            description: 'the ETag that was read',
          },
        ]
      : []),
    ...(creates ? [{ name: 'Idempotency-Key', in: 'header' as const, required: false, schema: text }] : []),
  ]
}

const problem = (description: string) => ({
  description,
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
})

function responsesOf(spec: EndpointSpec<unknown, unknown, unknown>, writes: boolean) {
  const schema = spec.output ? jsonSchema(spec.output, 'output') : {}
  return {
    [spec.creates ? '201' : '200']: { description: 'As asked', content: { 'application/json': { schema } } },
    ...(spec.params || spec.query || spec.input ? { '400': problem('Malformed') } : {}),
    ...(writes && !spec.open ? { '401': problem('Not signed in'), '403': problem('Not allowed') } : {}),
    ...(spec.params ? { '404': problem('Not found, or not visible to you') } : {}),
    ...(writes ? { '409': problem('The state does not allow it'), '422': problem('Against a rule') } : {}),
    ...(spec.edition ? { '412': problem('Stale'), '428': problem('If-Match is missing') } : {}),
  }
}

function operationOf(spec: EndpointSpec<unknown, unknown, unknown>, method: string) {
  const parameters = [
    ...parametersFrom(spec.params, 'path'),
    ...parametersFrom(spec.query, 'query'),
    ...headersOf(spec),
  ]
  const type = spec.body === 'raw' ? 'multipart/form-data' : 'application/json'
  return {
    summary: spec.summary,
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(spec.input ? { requestBody: { content: { [type]: { schema: jsonSchema(spec.input, 'input') } } } } : {}),
    responses: responsesOf(spec, method !== 'GET'),
  }
}

const isEndpoint = (value: unknown): value is Endpoint => typeof value === 'function' && 'spec' in value

function pathItemOf(route: object) {
  const methods = route as Record<string, unknown>
  const endpoints = METHODS.flatMap((method) => {
    const found = methods[method]
    return isEndpoint(found) ? [[method.toLowerCase(), operationOf(found.spec, method)] as const] : []
  })
  return Object.fromEntries(endpoints)
}

const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  requestId: z.string(),
})

/** The OpenAPI 3.1 document of these routes, made from the schemas that validate. */
export const describeApi = (routes: Routes) => ({
  openapi: '3.1.0',
  info: { title: 'Turnrow', version: '1', description: 'Positions and lengths in seconds. Errors as RFC 9457.' },
  paths: Object.fromEntries(Object.entries(routes).map(([path, route]) => [path, pathItemOf(route)])),
  components: {
    schemas: { Problem: z.toJSONSchema(problemSchema) },
    securitySchemes: { token: { type: 'http', scheme: 'bearer' } },
  },
})
