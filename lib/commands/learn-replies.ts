import { createHash } from 'node:crypto'
import { readdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import type { Language } from '@/lib/domain/language'
import { readByWords } from '@/lib/domain/reply-by-words'
import type { ReplyKind } from '@/lib/domain/reply-kind'
import { learn, type Example } from '@/lib/domain/reply-learning'
import { senseOf, type Asked } from '@/lib/domain/reply-sense'
import { traitsOf } from '@/lib/domain/reply-traits'

const folder = 'lib/domain/reply-examples'

function exampleOf(line: string): Example {
  const [known, language, asked, kind, text, ...rest] = line.split('\t')
  if (!text || rest.length > 0) throw new Error(`An example has five columns, not as here: ${line}`)
  const sense = senseOf(text, language as Language, asked as Asked)
  return {
    traits: traitsOf(sense, readByWords(sense)),
    kind: kind as ReplyKind,
    isKnown: known === 'known',
  }
}

const files = readdirSync(folder).filter((name) => name.endsWith('.txt'))
const texts = files.sort().map((name) => readFileSync(path.join(folder, name), 'utf8'))
const lines = texts.flatMap((text) => text.trim().split('\n'))
const { kinds, traits, weights } = learn(lines.map(exampleOf))
const most = weights.reduce((largest, weight) => Math.max(largest, Math.abs(weight)), 0)
const scale = most / 127
const packed = Buffer.from(Int8Array.from(weights, (weight) => Math.round(weight / scale)).buffer)
writeFileSync(
  path.join(folder, 'learned.json'),
  `${JSON.stringify({
    examples: createHash('sha256').update(texts.join('')).digest('hex'),
    kinds,
    scale,
    traits: traits.join('\n'),
    weights: packed.toString('base64'),
  })}\n`,
)
console.log(`${lines.length} examples, ${traits.length} traits`)
