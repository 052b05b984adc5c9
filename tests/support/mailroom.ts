import type { APIRequestContext } from '@playwright/test'
import { expect } from '@playwright/test'

interface Received {
  readonly to: string
  readonly subject: string
  readonly text: string
}

/** The link in the newest letter to an address with a subject like this, once it has come. */
export async function waitForLink(request: APIRequestContext, to: string, subject: RegExp): Promise<string> {
  let link: string | undefined
  await expect
    .poll(
      async () => {
        const { items } = (await (await request.get('/mailroom.json')).json()) as { items: readonly Received[] }
        const letter = items.find((item) => item.to === to && subject.test(item.subject))
        link = /https?:\/\/\S+/.exec(letter?.text ?? '')?.[0]
        return link
      },
      { timeout: 30_000, message: `a letter to ${to}` },
    )
    .toBeDefined()
  const url = new URL(link ?? '')
  return `${url.pathname}${url.search}`
}
