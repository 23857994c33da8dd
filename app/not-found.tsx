import type { Metadata } from 'next'
import { BrandMark } from '@/components/layout/BrandMark'
import { LinkButton } from '@/components/ui/LinkButton'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Not found' }

/** For an address that leads nowhere, or to what is not the reader's to see: the two are told apart to nobody. */
export default function NotFound() {
  return (
    <main
      id="main"
      className="mx-auto flex min-h-screen max-w-prose flex-col items-start justify-center gap-4 px-6"
    >
      <BrandMark size={40} />
      <h1 className="text-title">There is nothing at this address</h1>
      <p className="text-muted">
        The page may have moved, or it may not be yours to see. Check the address, or begin again from the
        front page.
      </p>
      <LinkButton href={paths.home()}>Go to the front page</LinkButton>
    </main>
  )
}
