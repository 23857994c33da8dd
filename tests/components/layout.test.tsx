import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, it, vi } from 'vitest'
import { currentLink } from '@/components/layout/currentLink'
import { NightBand } from '@/components/layout/NightBand'
import { RequestStrip } from '@/components/layout/RequestStrip'
import { SectionLinks } from '@/components/layout/SectionLinks'
import { SiteHeader } from '@/components/layout/SiteHeader'
import { themeFrom } from '@/components/layout/themes'

// Seen to fail with aria-current left out of HeaderNav, and with the lamp drawn by day, too.

let place = '/proposals/4F7-K2M'
const query = ''
vi.mock('next/navigation', async (original) => ({
  ...(await original<object>()),
  usePathname: () => place,
  useSearchParams: () => new URLSearchParams(query),
}))

const ridge = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }

function band(now: string) {
  render(
    <NightBand
      site={ridge}
      now={new Date(now)}
      utcOffsetHours={-3}
      next={{ words: 'Call 14 closes in', at: new Date('2027-03-31T22:00:00Z') }}
      href="/tools/season"
    />,
  )
  return document.body.textContent?.replaceAll('\u00a0', ' ') ?? ''
}

describe('the night band', () => {
  it('holds the next date, both clocks, and the night as one sentence', () => {
    const text = band('2027-03-18T02:14:07Z')
    expect(text).toContain('Call 14 closes in 13 d 19 h 45 min')
    expect(text).toContain('31 March 22:00 UTC')
    expect(text).toContain('02:14:07 UTC · 23:14 at the site')
    const link = screen.getByRole('link', {
      name: /^Tonight at the observatory: sunset 22:5\d, sunrise 10:4\d UTC; dark from/,
    })
    expect(link.getAttribute('href')).toBe('/tools/season')
    expect(screen.getByTestId('band-now')).toBeTruthy()
  })

  it('has no lamp by day', () => {
    band('2027-03-18T16:00:00Z')
    expect(screen.queryByTestId('band-now')).toBeNull()
  })
})

describe('the head', () => {
  beforeEach(() => {
    place = '/proposals/4F7-K2M'
    document.documentElement.removeAttribute('data-theme')
  })

  const head = (account: { name: string; href: string } | null) =>
    render(
      <SiteHeader
        home="/"
        links={[
          { href: '/proposals', label: 'Proposals' },
          { href: '/calls', label: 'Calls' },
        ]}
        asideLinks={[{ href: '/help', label: 'Help' }]}
        account={account}
        signIn="/sign-in"
        theme="day"
      />,
    )

  it('marks where one is', () => {
    head({ name: 'Ilse Marrowby', href: '/account' })
    const main = screen.getByRole('navigation', { name: 'Main' })
    expect(within(main).getByRole('link', { name: 'Proposals' }).getAttribute('aria-current')).toBe('page')
    expect(within(main).getByRole('link', { name: 'Calls' }).hasAttribute('aria-current')).toBe(false)
    expect(screen.queryByRole('link', { name: 'Sign in' })).toBeNull()
  })

  it('lets a visitor sign in', () => {
    head(null)
    expect(screen.getByRole('link', { name: 'Sign in' }).getAttribute('href')).toBe('/sign-in')
  })

  it('opens a menu on narrow screens, and Escape gives the focus back', async () => {
    const user = userEvent.setup()
    head({ name: 'Ilse Marrowby', href: '/account' })
    const button = screen.getByRole('button', { name: 'Menu' })
    expect(screen.queryByRole('navigation', { name: 'Menu' })).toBeNull()
    await user.click(button)
    const menu = screen.getByRole('navigation', { name: 'Menu' })
    expect(within(menu).getByRole('link', { name: 'Ilse Marrowby' })).toBeTruthy()
    await user.keyboard('{Escape}')
    expect(button.getAttribute('aria-expanded')).toBe('false')
    expect(document.activeElement).toBe(button)
  })

  it('changes the light and remembers it', async () => {
    const user = userEvent.setup()
    head(null)
    await user.click(screen.getAllByRole('button', { name: 'Theme: Day' })[0] as HTMLElement)
    await user.click(await screen.findByRole('button', { name: 'Red lamp' }))
    expect(document.documentElement.dataset.theme).toBe('red')
    expect(document.cookie).toContain('noctuary-theme=red')
    expect(screen.getAllByRole('button', { name: 'Theme: Red lamp' }).length).toBe(1)
  })

  it.each([
    ['dome', 'dome'],
    ['day', 'day'],
    ['purple', 'day'],
    [undefined, 'day'],
  ])('a cookie of %s is the theme %s', (cookie, theme) => {
    expect(themeFrom(cookie)).toBe(theme)
  })
})

describe('where one is', () => {
  const links = [{ href: '/' }, { href: '/office', also: ['/office/calls'] }, { href: '/office/fees' }]
  it.each([
    ['/', '/'],
    ['/office/fees', '/office/fees'],
    ['/office/fees/2M0-YXC', '/office/fees'],
    ['/office/calls/14', '/office'],
    ['/officers', undefined],
  ])('%s lies under %s', (pathname, href) => {
    expect(currentLink(links, pathname)?.href).toBe(href)
  })
})

describe('the pages of a proposal', () => {
  it('carry the request in a strip', () => {
    render(
      <RequestStrip
        cells={[
          { label: 'Draft', value: '4F7-K2M' },
          { label: 'Asked', value: '21.0 h', trailing: '2.50 nights' },
        ]}
        saved="Saved 02:14:05 UTC"
        history={<a href="/history">History</a>}
      />,
    )
    const strip = screen.getByRole('region', { name: 'The request' })
    expect(
      within(strip)
        .getAllByRole('term')
        .map((term) => term.textContent),
    ).toEqual(['Draft', 'Asked'])
    expect(
      within(strip)
        .getAllByRole('definition')
        .map((one) => one.textContent),
    ).toEqual(['4F7-K2M', '21.0 h · 2.50 nights'])
    expect(within(strip).getByRole('link', { name: 'History' })).toBeTruthy()
  })

  it('lead from section to section', () => {
    place = '/proposals/4F7-K2M/targets'
    render(
      <SectionLinks
        links={[
          { href: '/proposals/4F7-K2M/question', label: 'Question' },
          { href: '/proposals/4F7-K2M/targets', label: 'Targets' },
        ]}
        all={{ href: '/proposals/4F7-K2M', label: 'All sections' }}
      />,
    )
    expect(screen.getByRole('link', { current: 'page' }).textContent).toBe('Targets')
    expect(screen.getByRole('link', { name: 'All sections' })).toBeTruthy()
  })
})
