import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { SignOutButton } from '@/components/account/SignOutButton'
import { headerLinks, type Area } from '@/components/layout/desks'
import { Footer } from '@/components/layout/Footer'
import { NightBand } from '@/components/layout/NightBand'
import { SiteHeader } from '@/components/layout/SiteHeader'
import { themeCookie, themeFrom } from '@/components/layout/themes'
import { Tag } from '@/components/ui/Tag'
import { contextFor } from '@/lib/auth/contextFor'
import { readActor } from '@/lib/auth/readActor'
import { requestFacts } from '@/lib/auth/requestFacts'
import type { Role } from '@/lib/domain/actor'
import { readFrame } from '@/lib/domain/calls/readFrame'
import { paths } from '@/lib/paths'

const roleOf: Record<Area, Role | null> = {
  public: null,
  investigator: 'investigator',
  scientist: 'instrument-scientist',
  reviewer: 'reviewer',
  chair: 'chair',
  office: 'office',
}

const roleWord: Partial<Record<Area, string>> = { chair: 'chair', office: 'office' }

interface ChromeProps {
  area: Area
  /** Slug of the call the page is about, where the links depend on it. */
  panelCall?: string
  caution?: string
  children: ReactNode
}

/** Night band, head and foot around the pages of a group; pages bring their own `Main`. */
export async function Chrome({ area, panelCall, caution, children }: ChromeProps) {
  const actor = await readActor()
  const ctx = contextFor(actor, await requestFacts())
  const frame = await readFrame(ctx, roleOf[area])
  const theme = themeFrom((await cookies()).get(themeCookie)?.value)
  const { links, asideLinks } = headerLinks(area, actor, panelCall ?? frame.panelCall)
  const word = roleWord[area]
  const showsMoney = area === 'office' && ctx.payments.isTestMode
  return (
    <div className="flex min-h-screen flex-col">
      {frame.site ? (
        <NightBand
          site={frame.site}
          now={frame.now}
          utcOffsetHours={frame.site.utcOffsetHours}
          next={frame.next}
          href={paths.season()}
        />
      ) : null}
      <SiteHeader
        home={paths.home()}
        links={links}
        asideLinks={asideLinks}
        account={actor ? { name: word ? `${actor.name}, ${word}` : actor.name, href: paths.account() } : null}
        signIn={paths.signIn()}
        theme={theme}
        tag={showsMoney ? <Tag>Payments in test mode</Tag> : undefined}
        signOut={actor ? <SignOutButton /> : undefined}
      />
      {children}
      <Footer caution={caution} />
    </div>
  )
}
