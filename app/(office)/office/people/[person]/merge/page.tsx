import type { Metadata } from 'next'
import { MergeForm } from '@/components/office/MergeForm'
import { MergeSides } from '@/components/office/MergeSides'
import { Main } from '@/components/layout/Main'
import { Breadcrumb } from '@/components/ui/Breadcrumb'
import { PageTitle } from '@/components/ui/PageTitle'
import { openPage } from '@/lib/auth/openPage'
import { orNotFound } from '@/lib/auth/orNotFound'
import { readMerge } from '@/lib/domain/people/readMerge'
import { paths } from '@/lib/paths'
import { mergePeopleAction } from './actions'

export const metadata: Metadata = { title: 'Merge accounts' }

export default async function MergePage({
  params,
  searchParams,
}: {
  params: Promise<{ person: string }>
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const ctx = await openPage('/office/people/[person]/merge')
  const { person: id } = await params
  const { from } = await searchParams
  const email = typeof from === 'string' ? from.trim().slice(0, 254) : ''
  const view = await orNotFound(readMerge(ctx, /^\d{1,9}$/.test(id) ? Number(id) : 0, email))
  const { keep } = view
  return (
    <Main>
      <Breadcrumb
        steps={[
          { label: 'People', href: paths.office('people') },
          { label: keep.name, href: paths.officePerson(keep.id) },
          { label: 'Merge' },
        ]}
      />
      <PageTitle
        title={`Merge an account into that of ${keep.name}`}
        lead="All that belongs to the other moves to this one, and the other is shut. The logbook keeps who acted with which."
      />
      <div className="mt-6 max-w-lg">
        <MergeForm personId={keep.id} email={email} />
      </div>
      {email ? (
        <div className="mt-10">
          <MergeSides view={view} email={email} action={mergePeopleAction} />
        </div>
      ) : null}
    </Main>
  )
}
