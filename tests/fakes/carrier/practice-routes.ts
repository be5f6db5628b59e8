import type { Carrier } from './carrier'
import { isPossibleNumber } from './create-checks'
import { empty, json, parseJson, type Answer, type Asked } from './exchange'
import { readFault } from './faults'
import { phoneLedger, phoneSummaries } from './handset'
import { addHistory, readHistory } from './history'
import { receiveText, type InboundText } from './inbound'
import { emptyState } from './state'

/** Paths the carrier does not have: for tests, and for whoever holds a practice phone. */
export async function answerPractice(carrier: Carrier, asked: Asked): Promise<Answer> {
  const { method, path } = asked
  if (path === '/practice/inbound' && method === 'POST') return inbound(carrier, asked)
  if (path === '/practice/phones') return json(200, { phones: phoneSummaries(carrier) })
  const number = /^\/practice\/phones\/(\+\d+)$/.exec(path)?.[1]
  if (number) return json(200, phoneLedger(carrier, number))
  if (path === '/practice/history' && method === 'POST') return history(carrier, asked)
  if (path === '/practice/faults') return answerFaults(carrier, asked)
  if (path === '/practice/debugger') return json(200, { entries: carrier.state.debuggerLog })
  if (path === '/practice/opt-outs') return json(200, { optOuts: carrier.state.optOuts })
  if (path === '/practice/reset' && method === 'POST') return reset(carrier)
  return json(404, { message: 'no such practice path' })
}

/** Answers at once, or with `"wait": true` only after the desk's webhook has answered. */
async function inbound(carrier: Carrier, asked: Asked): Promise<Answer> {
  const given = parseJson(asked.text) as (Partial<InboundText> & { wait?: boolean }) | null
  if (!given || typeof given.from !== 'string' || !isPossibleNumber(given.from)) {
    return json(400, { message: 'from must be a phone number like +12125550100' })
  }
  const { message, delivered } = receiveText(carrier, {
    ...given,
    from: given.from,
    body: given.body ?? '',
  })
  if (given.wait) await delivered
  return json(201, { sid: message.sid, segments: message.segments })
}

function history(carrier: Carrier, asked: Asked): Answer {
  const texts = readHistory(parseJson(asked.text))
  if (!texts) return json(400, { message: 'texts must be a list of { phone, way, body, at }' })
  return json(201, { added: addHistory(carrier, texts) })
}

function answerFaults(carrier: Carrier, asked: Asked): Answer {
  if (asked.method === 'DELETE') {
    carrier.faults.length = 0
    return empty(204)
  }
  if (asked.method === 'POST') {
    const fault = readFault(parseJson(asked.text))
    if (typeof fault === 'string') return json(400, { message: fault })
    carrier.faults.push(fault)
    return json(201, fault)
  }
  return json(200, { faults: carrier.faults })
}

function reset(carrier: Carrier): Answer {
  Object.assign(carrier.state, emptyState())
  carrier.bySid.clear()
  carrier.pending.clear()
  carrier.faults.length = 0
  carrier.changed()
  return empty(204)
}
