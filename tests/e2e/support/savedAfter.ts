import type { Page } from '@playwright/test'

/** Does something that saves by itself, and waits until the server has answered. */
export async function savedAfter(page: Page, deed: () => Promise<unknown>): Promise<void> {
  const answered = page.waitForResponse((reply) => reply.request().method() === 'POST')
  await deed()
  await answered
}
