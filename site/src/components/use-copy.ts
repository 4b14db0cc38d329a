import { useState } from 'react'

export interface Copied {
  text: string
  /** The browser forbids copying: the text is shown to be copied by hand. */
  byHand: boolean
}

export function useCopy() {
  const [copied, setCopied] = useState<Copied>()
  const copy = async (text: string) => {
    try {
      await navigator.clipboard.writeText(text)
      setCopied({ text, byHand: false })
    } catch {
      setCopied({ text, byHand: true })
    }
  }
  return { copied, copy }
}
