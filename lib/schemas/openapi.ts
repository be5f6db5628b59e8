import {
  OpenApiGeneratorV31,
  OpenAPIRegistry,
  type RouteConfig,
} from '@asteasolutions/zod-to-openapi'
import { z } from 'zod'
import { rolesFor } from '@/lib/domain/role'
import { endpoints } from './api'
import type { Endpoint } from './endpoint'

/** As much of a JSON Schema as is looked into here. */
type PlainSchema = { properties?: Record<string, object>; required?: string[] }
type Parameter = { name: string; in: 'path' | 'query'; required: boolean; schema: object }

const refusalSchema = z.object({ reason: z.string() })
const problemsSchema = refusalSchema.extend({
  problems: z.array(z.object({ field: z.string(), message: z.string() })),
})

/** A schema as JSON Schema 2020-12, which OpenAPI 3.1 speaks: what comes in as sent, what goes out as got. */
function schemaOf(schema: z.ZodType, io: 'input' | 'output') {
  const { $schema: _dialect, ...plain } = z.toJSONSchema(schema, { io, unrepresentable: 'any' })
  return plain as PlainSchema
}

function json(description: string, schema: z.ZodType) {
  return content(description, 'application/json', schema)
}

function content(description: string, type: string, schema: z.ZodType) {
  return { description, content: { [type]: { schema: schemaOf(schema, 'output') } } }
}

const isWebhook = ({ path }: Endpoint) => path.startsWith('/api/sms/')

function parametersOf(definition: Endpoint): Parameter[] {
  const names = [...definition.path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name ?? '')
  const inPath = names.map((name): Parameter => ({
    name,
    in: 'path',
    required: true,
    schema: { type: 'string' },
  }))
  const query = definition.query ? schemaOf(definition.query, 'input') : {}
  const inQuery = Object.entries(query.properties ?? {}).map(([name, schema]): Parameter => ({
    name,
    in: 'query',
    required: (query.required ?? []).includes(name),
    schema,
  }))
  return [...inPath, ...inQuery]
}

function requestOf(definition: Endpoint): RouteConfig['request'] {
  if (!definition.body) return {}
  const type = isWebhook(definition) ? 'application/x-www-form-urlencoded' : 'application/json'
  const schema = schemaOf(definition.body, 'input')
  return { body: { required: true, content: { [type]: { schema } } } }
}

function responsesOf(definition: Endpoint): RouteConfig['responses'] {
  if (definition.act === 'public') {
    const type = isWebhook(definition) ? 'text/xml' : 'application/json'
    return {
      200: content('Done', type, definition.response),
      ...(isWebhook(definition) ? { 403: { description: 'Not signed by the carrier' } } : {}),
    }
  }
  return {
    200: json('Done', definition.response),
    401: json('Nobody is signed in', refusalSchema),
    403: json('The role may not do this, or the request came from another site', refusalSchema),
    404: json('There is no such thing', refusalSchema),
    409: json('The state of things does not allow it', refusalSchema),
    422: json('Some fields need mending', problemsSchema),
  }
}

/** The API in OpenAPI 3.1, made from the schemas that the routes check with. */
export function openApiDocument() {
  const registry = new OpenAPIRegistry()
  registry.registerComponent('securitySchemes', 'session', {
    type: 'apiKey',
    in: 'cookie',
    name: 'next-auth.session-token',
  })
  for (const definition of endpoints) {
    const isOpen = definition.act === 'public'
    registry.registerPath({
      method: definition.method,
      path: definition.path,
      summary: definition.summary,
      ...(isOpen ? {} : { description: `For: ${rolesFor(definition.act).join(', ')}.` }),
      security: isOpen ? [] : [{ session: [] }],
      parameters: parametersOf(definition),
      request: requestOf(definition),
      responses: responsesOf(definition),
    })
  }
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: '3.1.0',
    info: { title: 'Rillpost', version: '1' },
  })
}
