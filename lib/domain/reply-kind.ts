/** What a text can mean. */
export type ReplyKind =
  | 'done'
  | 'not-yet'
  | 'slow'
  | 'no-flow'
  | 'flow-figure'
  | 'broken'
  | 'odd-water'
  | 'unwell'
  | 'need-part'
  | 'ask'
  | 'thanks'
  | 'yes'
  | 'no'
  | 'choice'
  | 'stop'
  | 'start'
  | 'help'
  | 'wrong-number'
  | 'moved'
  | 'unclear'

export type ReplyReading = {
  kind: ReplyKind
  /** Bottle-fill time. */
  minutes?: number
  /** A bare 1, 2 or 3 where a numbered choice may have been asked; `minutes` is set too. */
  choice?: number
  /** 0 to 1; under `sureEnough` the kind is `unclear`. */
  sure: number
  /** A general danger sign of illness (WHO IMCI): go to a health worker now. */
  dangerSign?: boolean
  /** The text also says that the water is slow. */
  alsoSlow?: boolean
}

/** Below this a person reads the text. */
export const sureEnough = 0.6
