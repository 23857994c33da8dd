import type { ReactNode } from 'react'
import { Chrome } from '@/app/Chrome'
import { PanelSwitch } from '@/components/panel/PanelSwitch'
import { contextFor } from '@/lib/auth/contextFor'
import { readActor } from '@/lib/auth/readActor'
import { requestFacts } from '@/lib/auth/requestFacts'
import { hasSeveralPanels } from '@/lib/domain/panels/hasSeveralPanels'
import { readLedPanels } from '@/lib/domain/panels/readLedPanels'
import { paths } from '@/lib/paths'

export default async function Layout({
  children,
  params,
}: {
  children: ReactNode
  params: Promise<{ call: string }>
}) {
  const [{ call }, actor] = await Promise.all([params, readActor()])
  const ctx = actor ? contextFor(actor, await requestFacts()) : null
  const panels = ctx ? await readLedPanels(ctx, call) : []
  const isShared = ctx !== null && panels.length > 0 && (await hasSeveralPanels(ctx, call))
  return (
    <Chrome
      area="chair"
      panelCall={call}
      caution="Proposals come without names. A rank moved by hand is kept in the logbook with who, when and why."
    >
      <PanelSwitch panels={panels} between={isShared ? paths.panel(call, 'between') : null} />
      {children}
    </Chrome>
  )
}
