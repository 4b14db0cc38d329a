import { UntilReady } from './UntilReady.tsx'
import './find-field.css'

interface FindFieldProps {
  id: string
  label: string
  help: string
  text: string
  onText: (text: string) => void
}

/** Rows are found while the words are written; sending the form only puts the keyboard away. */
export function FindField({ id, label, help, text, onText }: FindFieldProps) {
  return (
    <UntilReady>
      <form
        role="search"
        className="find-field no-print"
        onSubmit={(event) => {
          event.preventDefault()
          // Not to a form around a dialog in which the field stands.
          event.stopPropagation()
          if (document.activeElement instanceof HTMLElement) document.activeElement.blur()
        }}
      >
        <label htmlFor={id}>{label}</label> <span id={`${id}-help`}>{help}</span>
        <input
          id={id}
          type="search"
          value={text}
          onChange={(event) => onText(event.target.value)}
          autoComplete="off"
          spellCheck={false}
          enterKeyHint="search"
          aria-describedby={`${id}-help`}
        />
      </form>
    </UntilReady>
  )
}
