import { Button } from '@radix-ui/themes'
import { useState } from 'react'

/** Copies the address that carries these inputs; where the browser forbids copying, it is shown to be copied by hand. */
export function CopyLink({ path }: { path: () => string }) {
  const [copied, setCopied] = useState<{ link: string; byHand: boolean }>()
  const copy = async () => {
    const link = new URL(path(), window.location.href).href
    try {
      await navigator.clipboard.writeText(link)
      setCopied({ link, byHand: false })
    } catch {
      setCopied({ link, byHand: true })
    }
  }
  return (
    <>
      <Button type="button" size="3" variant="outline" onClick={() => void copy()}>
        Copy link
      </Button>
      <p className="copy-note" role="status">
        {copied && (copied.byHand ? 'Copy this address:' : 'The link is copied. It carries these inputs.')}
      </p>
      {copied?.byHand && (
        <input
          className="copy-by-hand"
          aria-label="Address with these inputs"
          readOnly
          value={copied.link}
          onFocus={(event) => event.target.select()}
        />
      )}
    </>
  )
}
