import type { Page } from '@playwright/test'

/** Types a moment into a date field and its time beside it. */
export async function fillDate(page: Page, label: string, at: Date): Promise<void> {
  const group = page.getByRole('group', { name: label })
  await group.locator('input[type="date"]').fill(at.toISOString().slice(0, 10))
  await group.locator('input[type="time"]').fill(at.toISOString().slice(11, 19))
}
