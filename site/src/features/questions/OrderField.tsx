import { useState } from 'react'

interface OrderFieldProps {
  items: readonly { id: string; say: string }[]
  /** The ids as the learner has put them; absent while they stand as they came. */
  order: readonly string[] | undefined
  write: (order: string[]) => void
}

/** Things to be put in order, each moved up or down by a button. */
export function OrderField({ items, order, write }: OrderFieldProps) {
  const [said, setSaid] = useState('')
  const shown = order?.flatMap((id) => items.find((item) => item.id === id) ?? []) ?? items

  const move = (from: number, to: number) => {
    if (to < 0 || to >= shown.length) return
    const ids = shown.map(({ id }) => id)
    ids.splice(to, 0, ...ids.splice(from, 1))
    write(ids)
    setSaid(`“${shown[from]!.say}” is now ${to + 1} of ${shown.length}.`)
  }

  return (
    <>
      <p className="quiet">Put them in order, the first at the top.</p>
      <ol className="order">
        {shown.map(({ id, say }, i) => (
          <li key={id}>
            <span className="order-say">{say}</span>
            <span className="order-buttons no-print">
              <button
                type="button"
                aria-label={`Move up: ${say}`}
                aria-disabled={i === 0}
                onClick={() => move(i, i - 1)}
              >
                <Arrow d="M1 8L8 1L15 8" />
              </button>
              <button
                type="button"
                aria-label={`Move down: ${say}`}
                aria-disabled={i === shown.length - 1}
                onClick={() => move(i, i + 1)}
              >
                <Arrow d="M1 1L8 8L15 1" />
              </button>
            </span>
          </li>
        ))}
      </ol>
      <p className="out-of-sight" role="status">
        {said}
      </p>
    </>
  )
}

const Arrow = ({ d }: { d: string }) => (
  <svg width="16" height="9" viewBox="0 0 16 9" aria-hidden="true">
    <path d={d} fill="none" stroke="currentColor" strokeWidth="2" />
  </svg>
)
