import { openApiDocument } from '@/lib/schemas/openapi'

/** The API in OpenAPI, made from the schemas. Open to all: it tells nothing of anybody. */
export function GET(): Response {
  return Response.json(openApiDocument())
}
