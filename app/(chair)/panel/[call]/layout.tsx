import type { ReactNode } from 'react'
import { Chrome } from '@/app/Chrome'

export default async function Layout({
  children,
  params,
}: {
  children: ReactNode
  params: Promise<{ call: string }>
}) {
  const { call } = await params
  return (
    <Chrome
      area="chair"
      panelCall={call}
      caution="Proposals come without names. A rank moved by hand is kept in the logbook with who, when and why."
    >
      {children}
    </Chrome>
  )
}
