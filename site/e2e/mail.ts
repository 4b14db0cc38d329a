import { expect, type APIRequestContext } from '@playwright/test'

/** The link of the newest mail to this address, from the inbox of the mail fake, as a path of the site. */
export const linkFromMail = async (request: APIRequestContext, baseURL: string, to: string): Promise<string> => {
  const inbox = new URL(baseURL)
  inbox.port = String(Number(inbox.port) + 3)
  let link: string | undefined
  await expect
    .poll(async () => {
      const messages = (await (await request.get(`${inbox.origin}/messages?to=${encodeURIComponent(to)}`)).json()) as {
        text: string
      }[]
      link = /https?:\/\/\S+/.exec(messages.at(-1)?.text ?? '')?.[0]
      return link
    })
    .toBeTruthy()
  const { pathname, search } = new URL(link!)
  return pathname + search
}
