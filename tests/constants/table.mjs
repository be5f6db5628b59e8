import { careConstants } from './care.mjs'
import { figuresConstants } from './figures.mjs'
import { filterConstants } from './filter.mjs'
import { textsConstants } from './texts.mjs'

/**
 * Constants that the outside tests must hold: one change at a time of a source file, each of which must break a test
 * of that name in tests/outside. The text before the change stands once in its file.
 *
 * @type {{ what: string, file: string, test: string, changes: [from: string, to: string][] }[]}
 */
export const constants = [
  ...filterConstants,
  ...careConstants,
  ...textsConstants,
  ...figuresConstants,
]
