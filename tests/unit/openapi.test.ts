import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import { endpoints } from '@/lib/schemas/api'
import { openApiDocument } from '@/lib/schemas/openapi'

/** `app/api/wordings/[moment]/route.ts` as `/api/wordings/{moment}`. */
function pathOf(file: string): string {
  return `/${path.dirname(file)}`
    .replace(/^\/app/, '')
    .replace('[...nextauth]', '{action}')
    .replaceAll(/\[(\w+)\]/g, '{$1}')
}

/** Every method that a route file answers, as `get /api/rounds`. */
function routesOnDisk(): string[] {
  const files = readdirSync('app/api', { recursive: true, encoding: 'utf8' })
    .filter((file) => path.basename(file) === 'route.ts')
    .map((file) => path.join('app/api', file))
  return files.flatMap((file) => {
    // Declared (`export const GET = …`) or named in a list (`export { handler as GET }`).
    const exported = readFileSync(file, 'utf8').match(/^export .*$/gm) ?? []
    const methods = exported.flatMap((line) => [
      ...line.matchAll(/\b(GET|POST|PUT|DELETE|PATCH)\b/g),
    ])
    const found = methods.map(([method]) => `${method.toLowerCase()} ${pathOf(file)}`)
    if (found.length === 0) throw new Error(`No method was found in ${file}.`)
    return found
  })
}

describe('the list of endpoints', () => {
  it('has every method of every route under app/api', () => {
    const listed = new Set(endpoints.map(({ method, path: at }) => `${method} ${at}`))
    expect(routesOnDisk().filter((route) => !listed.has(route))).toEqual([])
  })

  it('has nothing that no route answers', () => {
    const onDisk = new Set(routesOnDisk())
    const listed = endpoints.map(({ method, path: at }) => `${method} ${at}`)
    expect(listed.filter((route) => !onDisk.has(route))).toEqual([])
  })

  it('has no route twice', () => {
    const listed = endpoints.map(({ method, path: at }) => `${method} ${at}`)
    expect(listed.length).toBe(new Set(listed).size)
  })
})

type Operation = { summary?: string; parameters?: { name: string; in: string }[] }

describe('the OpenAPI document', () => {
  const paths = openApiDocument().paths as Record<string, Record<string, Operation>>

  it('has every endpoint, with its summary', () => {
    for (const { method, path: at, summary } of endpoints) {
      expect(paths[at]?.[method]?.summary).toBe(summary)
    }
  })

  it('names every part of an address as a parameter', () => {
    for (const { method, path: at } of endpoints) {
      const parameters = paths[at]?.[method]?.parameters ?? []
      const names = parameters.filter((one) => one.in === 'path').map(({ name }) => name)
      expect(names).toEqual([...at.matchAll(/\{(\w+)\}/g)].map(([, name]) => name))
    }
  })
})
