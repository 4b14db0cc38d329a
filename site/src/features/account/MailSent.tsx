import { useEffect, useRef, type ReactNode } from 'react'

/** Says the same whether the address is known or not. */
export function MailSent({ email, children }: { email: string; children: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => heading.current?.focus(), [])
  return (
    <>
      <h1 ref={heading} tabIndex={-1}>
        Look in your mail
      </h1>
      <p>
        We sent a mail to <strong>{email}</strong>. {children}
      </p>
      <p className="quiet">
        Nothing there after a few minutes? Look among the unwanted mail, and check that the address is written right.
      </p>
    </>
  )
}
