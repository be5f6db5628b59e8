import type { Carrier } from './carrier'
import { json, type Asked, type Outcome } from './exchange'
import { answerPage } from './page-routes'
import { answerPractice } from './practice-routes'
import { apiVersion } from './resources'
import { answerRest } from './rest'

export function route(carrier: Carrier, asked: Asked): Outcome | Promise<Outcome> {
  if (asked.path.startsWith(`/${apiVersion}/`)) return answerRest(carrier, asked)
  if (asked.path.startsWith('/practice/')) return answerPractice(carrier, asked)
  return answerPage(carrier, asked) ?? json(404, { message: 'no such page' })
}
