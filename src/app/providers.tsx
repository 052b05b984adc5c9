import type { ReactNode } from 'react'
import { QueryClientProvider } from '@tanstack/react-query'
import { AppProvider, type App } from '../lib/app-context'

export interface ProvidersProps {
  readonly app: App
  readonly children: ReactNode
}

export function Providers({ app, children }: ProvidersProps) {
  return (
    <QueryClientProvider client={app.queryClient}>
      <AppProvider value={app}>{children}</AppProvider>
    </QueryClientProvider>
  )
}
