import Link from 'next/link'
import type { ReactNode } from 'react'
import { BrandMark } from './BrandMark'
import { HeaderNav, type HeaderLink } from './HeaderNav'
import { PhoneMenu } from './PhoneMenu'
import { ThemeSwitch } from './ThemeSwitch'
import type { ThemeId } from './themes'

export interface SiteHeaderProps {
  /** Where the mark leads. */
  home: string
  links: readonly HeaderLink[]
  /** Help and the like, before the account. */
  asideLinks?: readonly HeaderLink[]
  /** The person signed in (`Maud Ferrisay, office`) and where their account is; null shows the sign-in link. */
  account: { name: string; href: string } | null
  signIn: string
  theme: ThemeId
  /** A `Tag` such as `Payments in test mode`. */
  tag?: ReactNode
  /** A form or button that signs out, shown beside the name and in the phone's menu. */
  signOut?: ReactNode
}

/** The head of every page: mark, where to go, who one is, and the light. */
export function SiteHeader({
  home,
  links,
  asideLinks = [],
  account,
  signIn,
  theme,
  tag,
  signOut,
}: SiteHeaderProps) {
  return (
    <header className="border-b border-rule px-gutter">
      <div className="flex h-15 items-stretch justify-between gap-6">
        <div className="flex min-w-0 items-stretch gap-10">
          <Link href={home} className="flex items-center gap-2.5 text-section no-underline">
            <BrandMark />
            Noctuary
          </Link>
          <HeaderNav links={links} className="max-lg:hidden" />
        </div>
        <div className="flex items-center gap-5 text-table">
          {tag ? <span className="whitespace-nowrap max-2xl:hidden">{tag}</span> : null}
          <HeaderNav links={asideLinks} quiet label="More" className="max-lg:hidden" />
          {account ? (
            <Link
              href={account.href}
              className="font-medium whitespace-nowrap no-underline hover:underline max-lg:hidden"
            >
              {account.name}
            </Link>
          ) : (
            <Link href={signIn} className="text-accent underline underline-offset-4 hover:decoration-2">
              Sign in
            </Link>
          )}
          {signOut ? <span className="whitespace-nowrap max-lg:hidden">{signOut}</span> : null}
          <span className="max-lg:hidden">
            <ThemeSwitch initial={theme} />
          </span>
          <PhoneMenu
            links={[
              ...links,
              ...asideLinks,
              ...(account ? [{ href: account.href, label: account.name }] : []),
            ]}
          >
            {tag}
            <ThemeSwitch initial={theme} />
            {signOut}
          </PhoneMenu>
        </div>
      </div>
    </header>
  )
}
