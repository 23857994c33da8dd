'use client'

import { useQueryClient } from '@tanstack/react-query'
import { DataTable } from '@/components/tables/DataTable'
import { useTableQuery } from '@/components/tables/useTableQuery'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { officePeopleReply, type OfficePeopleReply } from '@/lib/domain/people/officeSchema'
import { paths } from '@/lib/paths'
import { OfficeSteps, type OfficeStep } from './OfficeStep'
import { officePeopleKey } from './officePeopleKey'
import { invitationColumns, peopleColumns } from './peopleColumns'

interface PeopleTableProps {
  initial: OfficePeopleReply
  ownId: number
  disable: FormAction<{ personId: number }, unknown>
  enable: FormAction<{ personId: number }, unknown>
  takeBack: FormAction<{ invitationId: number }, unknown>
}

/** Accounts and open invitations, with what the office can do to each. */
export function PeopleTable({ initial, ownId, disable, enable, takeBack }: PeopleTableProps) {
  const client = useQueryClient()
  const { data = initial } = useTableQuery({
    key: officePeopleKey,
    url: paths.api.table('office-people'),
    schema: officePeopleReply,
    initialData: initial,
  })
  const step: OfficeStep = async (deed, done) => {
    const answer = await deed()
    showToast(answer.ok ? done : answer.message)
    await client.invalidateQueries({ queryKey: officePeopleKey })
  }
  return (
    <OfficeSteps.Provider
      value={{
        ownId,
        toggle: (person) =>
          step(
            () => (person.isDisabled ? enable : disable)({ personId: person.id }),
            person.isDisabled
              ? `${person.name} can sign in again`
              : `${person.name} is shut out; sessions have ended`,
          ),
        takeBack: (line) =>
          step(() => takeBack({ invitationId: line.id }), `The invitation to ${line.email} is taken back`),
      }}
    >
      <DataTable
        caption="Accounts"
        columns={peopleColumns}
        rows={data.people}
        rowId={(row) => String(row.id)}
        find="Name, address or institute"
        chips={[
          { id: 'office', label: 'Office', matches: (row) => row.roles.some((r) => r.role === 'office') },
          { id: 'panel', label: 'Panels', matches: (row) => row.roles.some((r) => r.role === 'reviewer') },
          {
            id: 'instruments',
            label: 'Instruments',
            matches: (row) => row.roles.some((r) => r.role === 'instrument-scientist'),
          },
          { id: 'shut', label: 'Shut', matches: (row) => row.isDisabled },
          {
            id: 'attention',
            label: 'Wants attention',
            matches: (row) => row.addressFails || row.asksToBeErased,
          },
        ]}
        csv="people"
        page={100}
        tone={(row) => (row.addressFails || row.asksToBeErased ? 'attention' : null)}
      />
      {data.invitations.length > 0 ? (
        <section className="mt-10">
          <SectionHeading title="Invitations still open" />
          <div className="mt-4">
            <DataTable
              caption="Open invitations"
              columns={invitationColumns}
              rows={data.invitations}
              rowId={(row) => String(row.id)}
              urlPrefix="invitations"
              csv="invitations"
            />
          </div>
        </section>
      ) : null}
    </OfficeSteps.Provider>
  )
}
