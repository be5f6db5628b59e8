import { XMLParser, XMLValidator } from 'fast-xml-parser'

export type TwimlVerb =
  | {
      kind: 'message'
      body: string
      to: string
      from: string
      media: string[]
      statusCallback: string
    }
  | { kind: 'redirect'; url: string; method: 'POST' | 'GET' }

export type TwimlAnswer =
  { ok: true; verbs: TwimlVerb[] } | { ok: false; code: 12100 | 12200 | 12300; detail: string }

type XmlNode = { [name: string]: unknown; ':@'?: Record<string, string>; '#text'?: string }

const parser = new XMLParser({
  preserveOrder: true,
  ignoreAttributes: false,
  attributeNamePrefix: '',
  parseTagValue: false,
  parseAttributeValue: false,
  trimValues: false,
})

const xmlTypes = ['text/xml', 'application/xml', 'text/html']

/** Reads the desk's answer to a webhook. An empty body, and plain text as a message, are both allowed. */
export function readTwiml(contentType: string, body: string): TwimlAnswer {
  const type = (contentType.split(';')[0] ?? '').trim().toLowerCase()
  if (body.trim() === '') return { ok: true, verbs: [] }
  if (type === 'text/plain') return { ok: true, verbs: [plainMessage(body)] }
  if (!xmlTypes.includes(type)) return { ok: false, code: 12300, detail: contentType }
  const valid = XMLValidator.validate(body)
  if (valid !== true) return { ok: false, code: 12100, detail: valid.err.msg }
  const root = (parser.parse(body) as XmlNode[]).find((node) => !('?xml' in node))
  const inside = root?.Response
  if (!Array.isArray(inside)) return { ok: false, code: 12200, detail: 'no <Response> at the root' }
  const verbs: TwimlVerb[] = []
  for (const node of inside as XmlNode[]) {
    const verb = readVerb(node)
    if (verb) verbs.push(verb)
    else if (!isSpace(node)) {
      const name = Object.keys(node).find((key) => key !== ':@') ?? ''
      return { ok: false, code: 12200, detail: `<${name}> is not known for messages` }
    }
  }
  return { ok: true, verbs }
}

function plainMessage(body: string): TwimlVerb {
  return { kind: 'message', body, to: '', from: '', media: [], statusCallback: '' }
}

function readVerb(node: XmlNode): TwimlVerb | null {
  const attributes = node[':@'] ?? {}
  if (Array.isArray(node.Message)) {
    const inside = node.Message as XmlNode[]
    const bodies = inside.filter((child) => Array.isArray(child.Body))
    const text =
      bodies.length > 0 ? bodies.map((child) => textOf(child.Body)).join('') : textOf(inside)
    return {
      kind: 'message',
      body: text.trim(),
      to: attributes.to ?? '',
      from: attributes.from ?? '',
      media: inside
        .filter((child) => Array.isArray(child.Media))
        .map((c) => textOf(c.Media).trim()),
      statusCallback: attributes.statusCallback ?? attributes.action ?? '',
    }
  }
  if (Array.isArray(node.Redirect)) {
    const method = attributes.method?.toUpperCase() === 'GET' ? 'GET' : 'POST'
    return { kind: 'redirect', url: textOf(node.Redirect).trim(), method }
  }
  return null
}

function textOf(nodes: unknown): string {
  if (!Array.isArray(nodes)) return ''
  return (nodes as XmlNode[]).map((node) => node['#text'] ?? '').join('')
}

function isSpace(node: XmlNode): boolean {
  return '#text' in node && (node['#text'] ?? '').trim() === ''
}
