import type { Copied } from './use-copy.ts'
import './copy-note.css'

interface CopyNoteProps {
  copied: Copied | undefined
  /** What is said when it is done. */
  done: string
  /** "Copy this address:" */
  byHand: string
  /** What the text is. */
  label: string
  /** Lines of the text shown, where it is more than one. */
  lines?: number
}

/** Says that something was copied, or shows it to be copied by hand. */
export function CopyNote({ copied, done, byHand, label, lines }: CopyNoteProps) {
  const Field = lines ? 'textarea' : 'input'
  return (
    <>
      <p className="copy-note" role="status">
        {copied && (copied.byHand ? byHand : done)}
      </p>
      {copied?.byHand && (
        <Field
          className="copy-by-hand"
          aria-label={label}
          readOnly
          rows={lines}
          value={copied.text}
          onFocus={(event: { currentTarget: HTMLInputElement | HTMLTextAreaElement }) => event.currentTarget.select()}
        />
      )}
    </>
  )
}
