import type { ReactNode } from 'react'
import { Page } from './Page.tsx'

/** A page that has only one thing to say: not found, not allowed, not here. */
export function Notice({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="page">
      <Page title={title} />
      <h1>{title}</h1>
      {children}
    </div>
  )
}
