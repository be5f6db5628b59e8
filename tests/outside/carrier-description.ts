import { execFileSync } from 'node:child_process'
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, mkdtempSync, readFileSync, renameSync, rmSync } from 'node:fs'
import path from 'node:path'
import { Ajv, type ValidateFunction } from 'ajv'

const packed = '@twilio/cli-core@9.0.0'
const inside = 'package/src/services/twilio-api/twilio_api_v2010.json'
const folder = path.resolve(import.meta.dirname, '../../node_modules/.cache/carrier-description')
const expectedSha256 = '170b3ccd0f891416840083d72f1795b1499b14a18d4873fd2b39f47ef84642d6'

type Schema = { [name: string]: unknown }
type Description = {
  components: { schemas: Record<string, Schema> }
  paths: Record<string, Record<string, { responses: Record<string, Schema> }>>
}

/**
 * The carrier's published description, taken once from the registry into a cache folder. Throws when it cannot be
 * had: a contract that was not read must not count as kept.
 */
export function carrierDescription(): Description {
  const file = path.join(folder, path.basename(inside))
  if (!existsSync(file)) fetchDescription(file)
  const text = readFileSync(file)
  const sha256 = createHash('sha256').update(text).digest('hex')
  if (sha256 !== expectedSha256) throw new Error(`${file} is not the published file: ${sha256}`)
  return JSON.parse(text.toString('utf8')) as Description
}

/** Into a folder of its own first: two test files may want it at the same time. */
function fetchDescription(file: string): void {
  mkdirSync(path.dirname(file), { recursive: true })
  const cwd = mkdtempSync(path.join(folder, 'fetch-'))
  const options = { cwd, timeout: 120_000, stdio: 'pipe' } as const
  const isWindows = process.platform === 'win32'
  try {
    execFileSync('npm', ['pack', packed, '--silent'], { ...options, shell: isWindows })
    execFileSync('tar', ['-xzf', 'twilio-cli-core-9.0.0.tgz', inside], options)
    renameSync(path.join(cwd, inside), file)
  } finally {
    rmSync(cwd, { recursive: true })
  }
}

/** Formats the description names; the addresses of pages are relative, whatever it calls them. */
const formats: Record<string, RegExp> = {
  'date-time-rfc-2822':
    /^(Mon|Tue|Wed|Thu|Fri|Sat|Sun), \d{2} (Jan|Feb|Mar|Apr|May|Jun|Jul|Aug|Sep|Oct|Nov|Dec) \d{4} \d{2}:\d{2}:\d{2} \+0000$/,
  'phone-number': /^\+[1-9]\d{6,14}$/,
  currency: /^[A-Z]{3}$/,
  uri: /^\/2010-04-01\/\S+$/,
}

/**
 * Checks for answers, made from the description and tightened: it names no property as required and forbids none,
 * so here every property must be there and no other may.
 */
export function createChecks(description: Description) {
  // Not strict: the description carries words of its own (x-twilio) that are no part of JSON Schema.
  const ajv = new Ajv({ allErrors: true, strict: false })
  for (const [name, format] of Object.entries(formats)) ajv.addFormat(name, format)
  // uri-map stands on objects, where string formats say nothing; see `tightened`.
  ajv.addFormat('uri-map', true)
  const check = (schema: Schema): ValidateFunction => ajv.compile(tightened(description, schema))
  const answer = (route: string, method: string, status: string): ValidateFunction => {
    const response = description.paths[route]?.[method]?.responses[status] as
      { content: { 'application/json': { schema: Schema } } } | undefined
    if (!response) throw new Error(`the description has no ${method} ${route} ${status}`)
    return check(response.content['application/json'].schema)
  }
  return { answer, refusal: ajv.compile(refusalSchema) }
}

/** The description has no bodies of refusals; this is their documented form. */
const refusalSchema = {
  type: 'object',
  properties: {
    code: { type: 'integer', minimum: 10_000, maximum: 99_999 },
    message: { type: 'string', minLength: 1 },
    more_info: { type: 'string', pattern: '^https://www\\.twilio\\.com/docs/errors/\\d{5}$' },
    status: { type: 'integer', minimum: 400, maximum: 599 },
  },
  required: ['code', 'message', 'more_info', 'status'],
  additionalProperties: false,
}

function tightened(description: Description, schema: Schema): Schema {
  const reference = schema.$ref
  if (typeof reference === 'string') {
    const name = reference.replace('#/components/schemas/', '')
    const found = description.components.schemas[name]
    if (!found) throw new Error(`the description has no ${name}`)
    return tightened(description, found)
  }
  if (schema.format === 'uri-map') {
    const { nullable } = schema
    const uri = { type: 'string', pattern: '^/2010-04-01/' }
    return { type: 'object', nullable: nullable ?? false, additionalProperties: uri }
  }
  if (schema.type === 'array') {
    return { ...schema, items: tightened(description, schema.items as Schema) }
  }
  if (schema.type !== 'object' || !schema.properties) return schema
  const properties = Object.entries(schema.properties as Record<string, Schema>).map(
    ([name, property]) => [name, tightened(description, property)] as const,
  )
  return {
    ...schema,
    properties: Object.fromEntries(properties),
    required: properties.map(([name]) => name),
    additionalProperties: false,
  }
}
