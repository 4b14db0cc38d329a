import type { ReactNode } from 'react'

/** Practical work away from the screen. */
export function SiteTask({ children }: { children: ReactNode }) {
  return (
    <div className="site-task" role="note">
      <p className="aside-name">Task to do on site</p>
      {children}
    </div>
  )
}
