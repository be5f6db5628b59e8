import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import type { Carrier } from './carrier'
import { createClock, type CarrierClock } from './clock'
import { followClockBack, takeDueSteps } from './lifecycle'
import { answerStored } from './media-routes'
import { createShelf } from './phones-file'
import { route } from './routes'
import { serve } from './serve'
import type { Settings } from './settings'
import { createKeeper, loadState } from './store-file'
import { webhooksSettled } from './webhooks'

export type RunningCarrier = {
  carrier: Carrier
  origin: string
  /** Takes the steps that are due now, for tests that hold the clock themselves. */
  tick(): void
  /** Waits for webhooks under way. */
  settled(): Promise<void>
  close(): Promise<void>
}

const tickMilliseconds = 40

/** Starts the fake on loopback; port 0 takes any free one. `clock` replaces the wall clock in tests. */
export async function startCarrier(
  settings: Settings,
  clock: CarrierClock = createClock(settings.clockFile),
): Promise<RunningCarrier> {
  const state = loadState(settings.storeFile)
  const keeper = createKeeper(settings.storeFile, state)
  const carrier: Carrier = {
    settings,
    origin: '',
    mediaOrigin: '',
    clock,
    state,
    bySid: new Map(state.messages.map((message) => [message.sid, message])),
    pending: new Set(state.messages.filter((message) => message.plan.length > 0)),
    faults: [],
    underWay: new Set(),
    shelf: createShelf(settings.phonesFile),
    version: 1,
    changed() {
      carrier.version += 1
      keeper.changed()
    },
  }
  const main = createServer(serve((asked) => route(carrier, asked)))
  const stored = createServer(
    serve(({ path, headers }) =>
      answerStored(carrier, { path, authorization: headers.authorization !== undefined }),
    ),
  )
  carrier.origin = await listen(main, settings.port)
  carrier.mediaOrigin = await listen(stored, 0)
  const tick = createTick(carrier)
  const timer = setInterval(tick, tickMilliseconds)
  return {
    carrier,
    origin: carrier.origin,
    tick,
    settled: () => webhooksSettled(carrier),
    async close() {
      clearInterval(timer)
      await Promise.all([close(main), close(stored)])
      keeper.saveNow()
    },
  }
}

function createTick(carrier: Carrier): () => void {
  let before = carrier.clock.now()
  return () => {
    const now = carrier.clock.now()
    followClockBack(carrier, before, now)
    before = now
    takeDueSteps(carrier)
  }
}

/** Loopback only: the fake believes whoever can reach its practice paths. */
function listen(server: Server, port: number): Promise<string> {
  return new Promise((resolve, reject) => {
    server.once('error', reject)
    server.listen(port, '127.0.0.1', () => {
      resolve(`http://127.0.0.1:${(server.address() as AddressInfo).port}`)
    })
  })
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve())
    server.closeAllConnections()
  })
}
