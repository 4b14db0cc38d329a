import { Popover } from '@radix-ui/themes'
import type { ReactNode } from 'react'
import { glossary } from '#content/glossary.ts'

const meanings: Readonly<Record<string, string>> = glossary

/** A word of the trade with its meaning behind it. */
export function Gloss({ term, children = term }: { term: string; children?: ReactNode }) {
  const meaning = meanings[term]
  if (meaning === undefined) return children
  return (
    <Popover.Root>
      <Popover.Trigger>
        <button type="button" className="gloss">
          {children}
        </button>
      </Popover.Trigger>
      <Popover.Content size="2" maxWidth="22rem" className="gloss-meaning" aria-label={`What “${term}” means`}>
        <strong>{term}</strong>
        <p>{meaning}</p>
      </Popover.Content>
    </Popover.Root>
  )
}
