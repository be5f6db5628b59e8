'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import type { ReactNode } from 'react'

function makeClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      // The server has just rendered the first state: no second read of it on arrival.
      queries: { staleTime: 5_000, retry: 1 },
    },
  })
}

let inBrowser: QueryClient | undefined

/** One client in a browser; a new one for each render on the server, so that nobody sees another's data. */
function clientHere(): QueryClient {
  if (typeof window === 'undefined') return makeClient()
  inBrowser ??= makeClient()
  return inBrowser
}

/** What the staff pages need to read from the API and keep it fresh. */
export function QueryProvider({ children }: { children: ReactNode }) {
  return <QueryClientProvider client={clientHere()}>{children}</QueryClientProvider>
}
