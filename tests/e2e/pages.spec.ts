import { expect, test } from './support/test'

const views: readonly (readonly [role: string, email: string | null, paths: readonly string[]])[] = [
  [
    'a visitor',
    null,
    [
      '/',
      '/calls',
      '/calls/call-14',
      '/help',
      '/help/marks',
      '/help/calculations',
      '/sign-in',
      '/register',
      '/forgot-password',
      '/tools/yardstick',
      '/tools/season',
      '/tools/exposure',
    ],
  ],
  ['an investigator', 'ilse@tarnhead.example', ['/proposals', '/proposals/new', '/account']],
  ['a reviewer', 'delphine@ostbury.example', ['/reviews']],
  [
    'an instrument scientist',
    'signe@quillonridge.example',
    [
      '/assessments',
      '/assessments/instruments',
      '/assessments/instruments/ember-short',
      '/assessments/instruments/new',
    ],
  ],
  [
    'the chair',
    'edda@velm.example',
    [
      ...['assignments', 'progress', 'ranking', 'discussion', 'nights', 'decisions'].map(
        (page) => `/panel/call-13/${page}`,
      ),
      '/panel/call-11/between',
    ],
  ],
  [
    'the office',
    'maud@quillonridge.example',
    [
      'calls',
      'calls/call-14',
      'calls/call-14/rules',
      'calls/call-14/nights',
      'calls/call-13/figures',
      'calls/call-11/between',
      'calls/call-14/preview',
      'facility',
      'facility/sites/quillon-ridge',
      'facility/telescopes/aldous',
      'facility/modes/lantern-r',
      'facility/sites/new',
      'facility/telescopes/new',
      'facility/instruments/new',
      'facility/modes/new',
      'facility/retire/telescope/aldous',
      'people',
      'people/2',
      'people/2/merge?from=sten@harrowgate.example',
      'fees',
      'mail',
      'mail/letters',
      'mail/letters/new',
      'logbook',
    ].map((page) => `/office/${page}`),
  ],
]

for (const [role, email, paths] of views) {
  test(`${role} can read every page, on a desk and on a phone`, async ({ page, signIn, checkAccessible }) => {
    test.setTimeout(240_000)
    if (email) await signIn(email)
    for (const path of paths) {
      await page.setViewportSize({ width: 1440, height: 900 })
      const reply = await page.goto(path)
      expect(reply?.status(), path).toBe(200)
      await expect(page.getByRole('heading', { level: 1 }), path).toHaveCount(1)
      await expect(
        page.getByRole('link', { name: /night at the observatory|sunset/i }).first(),
        path,
      ).toBeVisible()
      await checkAccessible()
      await page.setViewportSize({ width: 360, height: 740 })
      const width = await page.evaluate(() => document.documentElement.scrollWidth)
      expect(width, `${path} at 360 px`).toBeLessThanOrEqual(360)
    }
  })
}
