import '@fontsource-variable/work-sans/wght.css'
import './styles/fonts.css'
import './globals.css'
import type { Metadata, Viewport } from 'next'
import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { SkipLink } from '@/components/layout/SkipLink'
import { themeCookie, themeFrom } from '@/components/layout/themes'
import { Providers } from './providers'

export const metadata: Metadata = {
  title: { default: 'Noctuary', template: '%s · Noctuary' },
  description: 'Calls for telescope time, from the first redshift to the last letter.',
  icons: { icon: '/favicon.svg' },
}

export const viewport: Viewport = { width: 'device-width', initialScale: 1 }

/** The shell of every page; the theme is read on the server, so that no page ever flashes white in a dark dome. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = themeFrom((await cookies()).get(themeCookie)?.value)
  return (
    <html lang="en-GB" data-theme={theme} suppressHydrationWarning>
      <body>
        <SkipLink />
        <Providers>{children}</Providers>
      </body>
    </html>
  )
}
