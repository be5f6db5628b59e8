/** Readings of what is left when there is neither danger nor trouble. */
export type AnswerKind =
  'done' | 'not-yet' | 'need-part' | 'ask' | 'thanks' | 'yes' | 'no' | 'start' | 'help' | 'moved'

export type Answer = { kind: AnswerKind; sure: number }
