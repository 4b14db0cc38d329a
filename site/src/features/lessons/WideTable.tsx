import type { ComponentProps } from 'react'

/** A table wider than the screen scrolls in a box of its own, by keyboard too. */
export function WideTable(props: ComponentProps<'table'>) {
  return (
    <div className="lesson-table" role="group" aria-label="Table" tabIndex={0}>
      <table {...props} />
    </div>
  )
}
