'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { useState, type ReactNode } from 'react'

const makeClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: {
        // A page hands its own data down; asking again at once would only cost a poor line.
        staleTime: 20_000,
        retry: 1,
        refetchOnWindowFocus: false,
      },
      // A press made while the line is down fails at once and says so, it does not go off later unseen.
      mutations: { networkMode: 'always' },
    },
  })

/** What the client parts of every page share. One client per browser, and per request on the server. */
export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(makeClient)
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>
}
