import { readFileSync } from 'node:fs'
import { languages } from '@/lib/domain/language'
import type { LabelledReply } from './reply-set'

/**
 * Texts that neither reader has seen: nobody read them while the word lists were written, and none is among the
 * examples. They stay so: what is learned from one of them moves to the examples, and a new text takes its place.
 */
export const unseenReplies: readonly LabelledReply[] = languages.flatMap((language) =>
  readFileSync(`tests/outside/replies/unseen/${language}.jsonl`, 'utf8')
    .trim()
    .split('\n')
    .map((line) => JSON.parse(line) as LabelledReply),
)
