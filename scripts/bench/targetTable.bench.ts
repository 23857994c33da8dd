import { createServer } from 'node:http'
import type { AddressInfo } from 'node:net'
import { fileURLToPath } from 'node:url'
import { chromium } from '@playwright/test'
import { build, type Rollup } from 'vite'
import { sayTime } from './measure'
import { reportText } from './report'

const root = fileURLToPath(new URL('../../', import.meta.url))

/** The page in its production form, by name of file. */
async function bundle(): Promise<Map<string, string | Uint8Array>> {
  const made = (await build({
    root: `${root}scripts/bench/targetTable`,
    configFile: false,
    logLevel: 'error',
    resolve: { alias: { '@': root.replace(/\/$/, '') } },
    define: { 'process.env.NODE_ENV': '"production"', 'process.env': '{}' },
    css: { postcss: root },
    build: { write: false },
  })) as Rollup.RollupOutput
  return new Map(
    made.output.map((file) => [`/${file.fileName}`, file.type === 'chunk' ? file.code : file.source]),
  )
}

const types: Readonly<Record<string, string>> = { html: 'text/html', js: 'text/javascript', css: 'text/css' }

interface Interactions {
  durationsMs: number[]
}

const files = await bundle()
const server = createServer((request, response) => {
  const name = request.url === '/' ? '/index.html' : (request.url ?? '')
  const file = files.get(name)
  response.writeHead(file === undefined ? 404 : 200, {
    'content-type': types[name.split('.').at(-1) ?? ''] ?? 'application/octet-stream',
  })
  response.end(file)
})
await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', args: ['--no-sandbox'] })
try {
  const page = await browser.newPage({ viewport: { width: 1440, height: 1000 } })
  await page.goto(`http://127.0.0.1:${(server.address() as AddressInfo).port}/`)
  const cell = page.locator('[data-row="250"][data-cell="redshift"]')
  await cell.scrollIntoViewIfNeeded()
  await cell.click()
  // What the page still does after it first stands is not what is measured.
  await page.evaluate(() => new Promise((resolve) => requestIdleCallback(resolve)))
  await page.waitForTimeout(3000)
  // From a key to the next picture on the screen, as the browser itself measures it.
  await page.evaluate(() => {
    const kept: Interactions = { durationsMs: [] }
    Object.assign(window, { kept })
    new PerformanceObserver((list) => {
      for (const entry of list.getEntries())
        if ('interactionId' in entry && entry.interactionId) kept.durationsMs.push(entry.duration)
    }).observe({ type: 'event', durationThreshold: 16 } as PerformanceObserverInit)
  })
  const keys = [
    '1',
    '.',
    '2',
    '3',
    '4',
    'Enter',
    '0',
    '.',
    '7',
    '7',
    'ArrowDown',
    '2',
    '.',
    '1',
    'ArrowUp',
    'Enter',
  ]
  for (const key of keys) {
    await page.keyboard.press(key)
    await page.waitForTimeout(250)
  }
  const durations = await page.evaluate(() => (window as unknown as { kept: Interactions }).kept.durationsMs)
  const inOrder = durations.toSorted((a, b) => a - b)
  const at = (share: number) => inOrder[Math.floor(share * (inOrder.length - 1))] ?? 0
  reportText(
    `${keys.length} keys in a table of 500 targets in Chromium, the middle one and the worst`,
    `${sayTime(at(0.5) / 1000)}, ${sayTime(at(1) / 1000)}`,
    'asked for: below 100 ms',
  )
} finally {
  await browser.close()
  server.close()
}
