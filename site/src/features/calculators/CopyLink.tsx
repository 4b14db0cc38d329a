import { Button } from '@radix-ui/themes'
import { CopyNote } from '../../components/CopyNote.tsx'
import { useCopy } from '../../components/use-copy.ts'

/** Copies the address that carries these inputs; where the browser forbids copying, it is shown to be copied by hand. */
export function CopyLink({ path, leavesOut }: { path: () => string; leavesOut: readonly string[] }) {
  const { copied, copy } = useCopy()
  return (
    <>
      <Button
        type="button"
        size="3"
        variant="outline"
        onClick={() => void copy(new URL(path(), window.location.href).href)}
      >
        Copy link
      </Button>
      <CopyNote
        copied={copied}
        done={leavesOut.length === 0 ? 'The link is copied. It carries these inputs.' : 'The link is copied.'}
        byHand="Copy this address:"
        label="Address with these inputs"
      />
      {leavesOut.length > 0 && (
        <p className="copy-note">
          A link does not carry the {leavesOut.join(' and ')}: a record is too long for one. All else it does.
        </p>
      )}
    </>
  )
}
