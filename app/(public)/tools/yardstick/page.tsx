import type { Metadata } from 'next'
import { Main } from '@/components/layout/Main'
import { Yardstick } from '@/components/tools/yardstick/Yardstick'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { readState, type Query } from '@/lib/domain/tools/yardstick/stateQuery'

export const metadata: Metadata = {
  title: 'Yardstick',
  description:
    'Distances, times, sizes and volumes from redshifts, under one to six cosmologies side by side.',
}

export default async function YardstickPage({ searchParams }: { searchParams: Promise<Query> }) {
  await openPage('/tools/yardstick')
  const query = await searchParams
  const { state, troubles } = readState(query)
  return (
    <Main>
      <PageTitle title="Yardstick" lead="Give redshifts and a cosmology; read distances, times and sizes." />
      <Yardstick key={JSON.stringify(query)} initial={state} troubles={troubles} />
    </Main>
  )
}
