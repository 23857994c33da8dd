import { expect, type APIRequestContext } from '@playwright/test'

export interface InboxLetter {
  subject: string
  text: string
  html: string
  receivedAt: string
}

/** Letters to an address in the local inbox, the newest first. */
export async function lettersTo(request: APIRequestContext, address: string): Promise<InboxLetter[]> {
  const reply = await request.get(`${process.env.INBOX_URL}/api/messages?to=${encodeURIComponent(address)}`)
  return (await reply.json()) as InboxLetter[]
}

/** Waits for a letter whose subject has this shape; letters go out within seconds. */
export async function letter(
  request: APIRequestContext,
  address: string,
  subject: RegExp,
): Promise<InboxLetter> {
  const find = async () => (await lettersTo(request, address)).find((one) => subject.test(one.subject))
  await expect.poll(async () => (await find())?.subject, { timeout: 30_000 }).toMatch(subject)
  return (await find()) as InboxLetter
}

/** The first address of the product in a letter. */
export function linkIn(text: string): string {
  const found = /https?:\/\/\S+/.exec(text)
  if (!found) throw new Error('the letter holds no link')
  return found[0]
}
