import { flushSync } from 'react-dom'
import './plus-minus.css'

interface PlusMinusProps {
  /** The field it writes into. */
  fieldId: string
  text: string
  onText: (text: string) => void
}

/** Writes ± where the cursor stands: a phone's keys for numbers have none. It is seen while its field has the focus, which it leaves there. */
export function PlusMinus({ fieldId, text, onText }: PlusMinusProps) {
  if (text.includes('±')) return null
  const write = () => {
    const field = document.getElementById(fieldId) as HTMLInputElement | null
    const at = field?.selectionEnd ?? text.length
    const before = `${text.slice(0, at).trimEnd()} ± `
    flushSync(() => onText(before + text.slice(at).trimStart()))
    field?.focus()
    field?.setSelectionRange(before.length, before.length)
  }
  return (
    <button
      type="button"
      className="plus-minus no-print"
      // With a keyboard it is typed, or +/- for it.
      tabIndex={-1}
      aria-label="Add ±, one standard uncertainty"
      onPointerDown={(event) => event.preventDefault()}
      onClick={write}
    >
      ±
    </button>
  )
}
