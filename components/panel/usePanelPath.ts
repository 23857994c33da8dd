'use client'

import { useSearchParams } from 'next/navigation'
import { panelNumber } from '@/lib/domain/panels/schema'
import { paths, type PanelPage } from '@/lib/paths'

/** Addresses of the panel's other pages: of the panel the address names, where it names one. */
export function usePanelPath(callSlug: string): (page: PanelPage) => string {
  const asked = panelNumber.safeParse(useSearchParams().get('panel'))
  return (page) => paths.panel(callSlug, page, asked.data)
}
