import { chromium, type Page } from '@playwright/test'
import { addressOfRunning } from '../services/runningNote'
import { sayTime } from './measure'
import { reportText } from './report'

const ROUNDS = 40
const name = 'autosave, from the request to the start of the answer, 95 of 100 below'
// The built application; a development server compiles and checks while it answers.
const address = addressOfRunning('demo')

/** The draft of the demonstration that its investigator may change; the title it has is given back at the end. */
async function openDraft(page: Page, base: string): Promise<void> {
  await page.goto(`${base}/sign-in`)
  await page.getByLabel('E-mail').fill('ilse@tarnhead.example')
  await page.getByLabel('Password').fill('night-after-night')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'))
  await page.goto(`${base}/proposals`)
  const draft = page.getByRole('row').filter({ hasText: 'draft' }).getByRole('link').first()
  const href = await draft.getAttribute('href')
  // What is typed before the page has woken up is not seen by it.
  await page.goto(`${base}${href ?? ''}/question`, { waitUntil: 'networkidle' })
}

/** Times of saves as the page makes them by itself, milliseconds: action, verb, database, answer. */
async function roundTrips(page: Page): Promise<number[]> {
  const title = page.getByLabel('Title')
  const before = await title.inputValue()
  const times: number[] = []
  const save = async (text: string) => {
    // An action answers when it is done; the end of its stream is not always told.
    const answered = page.waitForResponse((reply) => reply.request().method() === 'POST')
    await title.fill(text)
    return (await answered).request().timing().responseStart
  }
  for (let round = 0; round < ROUNDS; round += 1) times.push(await save(`${before} ${round}`))
  await save(before)
  return times
}

if (address) {
  const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox'] })
  try {
    const page = await browser.newPage()
    page.setDefaultTimeout(120_000)
    await openDraft(page, address)
    const times = (await roundTrips(page)).toSorted((a, b) => a - b)
    const p95 = times[Math.ceil(0.95 * times.length) - 1] ?? NaN
    const middle = times[Math.floor(times.length / 2)] ?? NaN
    reportText(
      name,
      `${sayTime(p95 / 1000)}, the middle ${sayTime(middle / 1000)}`,
      'asked for: below 150 ms',
    )
  } finally {
    await browser.close()
  }
} else reportText(name, 'skipped', 'start the application first: npm start')
