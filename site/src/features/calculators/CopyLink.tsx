import { Button } from '@radix-ui/themes'
import { CopyNote } from '../../components/CopyNote.tsx'
import { useCopy } from '../../components/use-copy.ts'

/** Copies the address that carries these inputs; where the browser forbids copying, it is shown to be copied by hand. */
export function CopyLink({ path }: { path: () => string }) {
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
        done="The link is copied. It carries these inputs."
        byHand="Copy this address:"
        label="Address with these inputs"
      />
    </>
  )
}
