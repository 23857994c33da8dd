'use client'

import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { NuqsAdapter } from 'nuqs/adapters/next/app'
import { useState, type ReactNode } from 'react'
import { Toaster } from '@/components/ui/Toaster'

const halfMinute = 30_000

/** What every client component may lean on: the query cache, the address as state, and toasts. */
export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(
    () =>
      new QueryClient({
        defaultOptions: { queries: { staleTime: halfMinute, refetchOnWindowFocus: false, retry: 1 } },
      }),
  )
  return (
    <QueryClientProvider client={client}>
      <NuqsAdapter>
        {children}
        <Toaster />
      </NuqsAdapter>
    </QueryClientProvider>
  )
}
