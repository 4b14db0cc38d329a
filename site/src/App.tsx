import { Theme } from '@radix-ui/themes'
import { QueryClientProvider, type QueryClient } from '@tanstack/react-query'
import type { ReactNode } from 'react'
import './theme/theme.css'

export function App({ queryClient, children }: { queryClient: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <Theme appearance="inherit" accentColor="amber" grayColor="sand" radius="small" panelBackground="solid">
        {children}
      </Theme>
    </QueryClientProvider>
  )
}
