'use client'

import { useRouter } from 'next/navigation'
import { createContext, useContext } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { DataTable } from '@/components/tables/DataTable'
import type { TableColumn } from '@/components/tables/tableColumn'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { GrantView } from '@/lib/domain/people/personView'
import { ABSENT, countInWords, formatUtcWithYear } from '@/lib/format'
import { roleInWords } from './roleInWords'

const End = createContext<((grant: GrantView) => void) | null>(null)

function EndButton({ grant }: { grant: GrantView }) {
  const end = useContext(End)
  if (grant.role === 'investigator' || (grant.stands !== 'holds' && grant.stands !== 'to come')) return null
  return (
    <LinkLikeButton onClick={() => end?.(grant)} aria-label={`End the role ${roleInWords(grant)}`}>
      End
    </LinkLikeButton>
  )
}

const words: Record<GrantView['stands'], string> = {
  holds: 'holds',
  'to come': 'to come',
  over: 'over',
  ended: 'ended by the office',
}

const when = (at: string | null) => (at ? formatUtcWithYear(new Date(at)) : ABSENT)

const columns: TableColumn<GrantView>[] = [
  { id: 'role', head: 'Role', value: roleInWords },
  { id: 'panel', head: 'Panel', value: (row) => row.panel, cell: (row) => row.panel ?? ABSENT },
  { id: 'from', head: 'From', value: (row) => row.fromAt, cell: (row) => when(row.fromAt) },
  { id: 'until', head: 'Until', value: (row) => row.untilAt, cell: (row) => when(row.untilAt) },
  { id: 'by', head: 'Given by', value: (row) => row.grantedBy, cell: (row) => row.grantedBy ?? ABSENT },
  { id: 'stands', head: 'Stands', value: (row) => words[row.stands] },
  { id: 'deed', head: '', value: () => '', sortable: false, cell: (row) => <EndButton grant={row} /> },
]

interface RolesOfPersonProps {
  grants: readonly GrantView[]
  end: FormAction<{ grantId: number }, { unfinished: number }>
}

/** The roles of an account with their dates; those in force can be ended. */
export function RolesOfPerson({ grants, end }: RolesOfPersonProps) {
  const router = useRouter()
  const take = async (grant: GrantView) => {
    const answer = await end({ grantId: grant.id })
    if (!answer.ok) showToast(answer.message)
    else
      showToast(
        answer.data.unfinished > 0
          ? `Ended. ${countInWords(answer.data.unfinished, 'review', 'reviews')} unfinished: the chair gives them to others`
          : 'The role has ended',
      )
    router.refresh()
  }
  return (
    <End.Provider value={(grant) => void take(grant)}>
      <DataTable
        caption="Roles"
        columns={columns}
        rows={grants}
        rowId={(row) => String(row.id)}
        urlPrefix="roles"
      />
    </End.Provider>
  )
}
