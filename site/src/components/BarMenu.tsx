import type { MouseEvent, ReactNode } from 'react'

/** A list behind a button. The browser's own popover brings Escape, a press outside, and focus back to the button. */
export function BarMenu({ id, label, children }: { id: string; label: string; children: ReactNode }) {
  const closeAfterLink = (event: MouseEvent<HTMLDivElement>) => {
    if ((event.target as Element).closest('a')) event.currentTarget.hidePopover()
  }
  return (
    <div className="bar-menu">
      <button type="button" className="bar-menu-button" popoverTarget={id}>
        {label}
        <svg width="12" height="8" viewBox="0 0 12 8" aria-hidden="true">
          <path d="M1 1L6 6.5L11 1" fill="none" stroke="currentColor" strokeWidth="2" />
        </svg>
      </button>
      <div id={id} popover="auto" className="bar-menu-list" onClick={closeAfterLink}>
        {children}
      </div>
    </div>
  )
}
