'use client'

import { useContext } from 'react'
import type { TableColumn } from '@/components/tables/tableColumn'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { TextLink } from '@/components/ui/TextLink'
import type { OfficePersonRow, OpenInvitationRow } from '@/lib/domain/people/officeSchema'
import { formatList, formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'
import { OfficeSteps } from './OfficeStep'
import { roleInWords } from './roleInWords'
import { rolesInWords } from './rolesInWords'

function Toggle({ person }: { person: OfficePersonRow }) {
  const steps = useContext(OfficeSteps)
  if (!steps || person.id === steps.ownId) return null
  return (
    <LinkLikeButton
      onClick={() => void steps.toggle(person)}
      aria-label={`${person.isDisabled ? 'Open' : 'Shut'} the account of ${person.name}`}
    >
      {person.isDisabled ? 'Open again' : 'Shut'}
    </LinkLikeButton>
  )
}

function TakeBack({ line }: { line: OpenInvitationRow }) {
  const steps = useContext(OfficeSteps)
  return (
    <LinkLikeButton
      onClick={() => void steps?.takeBack(line)}
      aria-label={`Take back the invitation to ${line.name}`}
    >
      Take back
    </LinkLikeButton>
  )
}

/** Investigators are everybody: only further roles are worth a word. */
const rolesOf = (row: OfficePersonRow) =>
  rolesInWords(row.roles.filter((role) => role.role !== 'investigator'))

const stands = (row: OfficePersonRow) =>
  [
    row.isDisabled ? 'shut' : row.isConfirmed ? '' : 'not confirmed',
    row.addressFails ? 'letters do not reach it' : '',
    row.asksToBeErased ? 'asks to be erased' : '',
  ]
    .filter(Boolean)
    .join(', ')

/** Columns of the accounts. */
export const peopleColumns: TableColumn<OfficePersonRow>[] = [
  {
    id: 'name',
    head: 'Name',
    value: (row) => row.name,
    cell: (row) => (
      <span className="sm:whitespace-nowrap">
        <TextLink href={paths.officePerson(row.id)}>{row.name}</TextLink>
      </span>
    ),
  },
  { id: 'email', head: 'E-mail', value: (row) => row.email },
  { id: 'institute', head: 'Institute', value: (row) => row.institute },
  { id: 'roles', head: 'Roles', value: rolesOf, cell: (row) => rolesOf(row) || 'investigator' },
  { id: 'stands', head: 'Account', value: stands },
  { id: 'deed', head: '', value: () => '', sortable: false, cell: (row) => <Toggle person={row} /> },
]

/** Columns of the open invitations. */
export const invitationColumns: TableColumn<OpenInvitationRow>[] = [
  { id: 'name', head: 'Name', value: (row) => row.name },
  { id: 'email', head: 'E-mail', value: (row) => row.email },
  { id: 'role', head: 'Role', value: (row) => formatList([roleInWords(row)]) },
  {
    id: 'until',
    head: 'Open until',
    value: (row) => row.expiresAt,
    cell: (row) => formatUtcWithYear(new Date(row.expiresAt)),
  },
  { id: 'deed', head: '', value: () => '', sortable: false, cell: (row) => <TakeBack line={row} /> },
]
