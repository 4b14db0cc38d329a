import type { ReactNode } from 'react'

/** Common practice for which no source can be named. */
export function FromTheTrade({ children }: { children: ReactNode }) {
  return (
    <div className="from-the-trade" role="note">
      <p className="aside-name">
        From the trade <span>common practice, no source</span>
      </p>
      {children}
    </div>
  )
}
