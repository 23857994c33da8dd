'use client'

import { useSearchParams } from 'next/navigation'
import type { HeaderLink } from './HeaderNav'

/** The links as they are followed from here: a link takes along what it names of the address one is at. */
export function useCarriedLinks(links: readonly HeaderLink[]): readonly (HeaderLink & { to: string })[] {
  const here = useSearchParams()
  return links.map((link) => {
    const carried = new URLSearchParams()
    for (const name of link.carries ?? []) {
      const value = here.get(name)
      if (value !== null) carried.set(name, value)
    }
    return { ...link, to: carried.size > 0 ? `${link.href}?${carried.toString()}` : link.href }
  })
}
