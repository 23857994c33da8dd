import { AxeBuilder } from '@axe-core/playwright'
import { expect, test as base, type Page } from '@playwright/test'
import { brokenPromises } from './promises'

export const password = 'night-after-night'

interface Fixtures {
  /** Signs in by the form, as a person would. */
  signIn: (email: string, secret?: string) => Promise<void>
  /** No serious finding of axe on the page as it stands. */
  checkAccessible: () => Promise<void>
  /** Console errors that the test provokes on purpose; anything else fails it. */
  expectedNoise: RegExp[]
  /** What trust promises of the data holds after every journey. */
  promises: void
}

async function signInOn(page: Page, email: string, secret: string): Promise<void> {
  await page.goto('/sign-in')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(secret)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
}

/** A browser in which an unexpected console error or page error fails the test. */
export const test = base.extend<Fixtures>({
  expectedNoise: [[], { option: true }],
  page: async ({ page, expectedNoise }, use) => {
    const noise: string[] = []
    page.on('console', (message) => {
      if (message.type() === 'error') noise.push(message.text())
    })
    page.on('pageerror', (error) => noise.push(String(error)))
    await use(page)
    const unexpected = noise.filter((text) => !expectedNoise.some((shape) => shape.test(text)))
    expect(unexpected, 'console errors').toEqual([])
  },
  promises: [
    async ({}, use) => {
      await use()
      expect(await brokenPromises(), 'promises of the data').toEqual([])
    },
    { auto: true },
  ],
  signIn: async ({ page }, use) => {
    await use((email, secret = password) => signInOn(page, email, secret))
  },
  checkAccessible: async ({ page }, use) => {
    await use(async () => {
      const { violations } = await new AxeBuilder({ page })
        .withTags(['wcag2a', 'wcag2aa', 'wcag21aa', 'wcag22aa'])
        .analyze()
      const found = violations
        .filter(({ impact }) => impact === 'serious' || impact === 'critical')
        .map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join('; ')}`)
      expect(found, page.url()).toEqual([])
    })
  },
})

export { expect }
