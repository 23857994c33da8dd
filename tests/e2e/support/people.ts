import type { Browser, Page } from '@playwright/test'
import { password } from './test'

/** A browser of its own in which somebody is signed in. */
export async function desk(
  browser: Browser,
  baseURL: string | undefined,
  email: string,
  secret = password,
): Promise<Page> {
  const context = await browser.newContext({ baseURL, viewport: { width: 1440, height: 1000 } })
  const page = await context.newPage()
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(secret)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
  return page
}
