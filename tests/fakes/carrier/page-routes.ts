import type { Carrier } from './carrier'
import { html, type Answer, type Asked } from './exchange'
export function answerPage(_c: Carrier, asked: Asked): Answer | null {
  return asked.path === '/' ? html('soon') : null
}
