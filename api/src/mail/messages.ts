import { escapeHtml } from '../common/escape-html.ts'

/** A mail in plain words, printed as text and as HTML from the same lines. */
export interface Message {
  subject: string
  text: string
  html: string
}

interface Lines {
  subject: string
  before: readonly string[]
  link: { say: string; url: string }
  after: readonly string[]
}

const signature = 'Leatwright'

function message({ subject, before, link, after }: Lines): Message {
  const paragraph = (line: string) => `<p>${escapeHtml(line)}</p>`
  return {
    subject,
    text: [...before, `${link.say}:\n${link.url}`, ...after, signature].join('\n\n') + '\n',
    html: [
      '<!doctype html><html lang="en"><body>',
      ...before.map(paragraph),
      `<p><a href="${escapeHtml(link.url)}">${escapeHtml(link.say)}</a></p>`,
      ...after.map(paragraph),
      paragraph(signature),
      '</body></html>',
    ].join('\n'),
  }
}

/** Nothing that was typed at sign-up stands in these: whoever typed it need not own the address. */
export const confirmAddressMail = ({ link }: { link: string }) =>
  message({
    subject: 'Confirm your address',
    before: ['Somebody, we hope you, signed up for Leatwright with this address.'],
    link: { say: 'Confirm the address and go in', url: link },
    after: ['The link works once, for two days. If it was not you, do nothing: without it there is no account.'],
  })

export const accountExistsMail = ({ link }: { link: string }) =>
  message({
    subject: 'You have an account already',
    before: ['Somebody, perhaps you, tried to sign up for Leatwright with this address. It has an account already.'],
    link: { say: 'Sign in, or ask for a new password there', url: link },
    after: ['If it was not you, do nothing: your account is as it was.'],
  })

export const resetPasswordMail = ({ link }: { link: string }) =>
  message({
    subject: 'Choose a new password',
    before: ['Somebody, we hope you, asked for a new password for Leatwright.'],
    link: { say: 'Choose a new password', url: link },
    after: ['The link works once, for an hour. If it was not you, do nothing: your password is as it was.'],
  })
