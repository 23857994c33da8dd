'use client'

import { useRouter } from 'next/navigation'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { BarNote } from '@/components/ui/BarNote'
import { ConfirmTyped } from '@/components/ui/ConfirmTyped'
import { Facts } from '@/components/ui/Facts'
import { showToast } from '@/components/ui/showToast'
import type { MergeView } from '@/lib/domain/people/mergeWords'
import { ABSENT, countInWords, formatNumber } from '@/lib/format'
import { paths } from '@/lib/paths'

interface MergeSidesProps {
  view: MergeView
  email: string
  action: FormAction<{ keepId: number; goneId: number }, { moved: number }>
}

const facts = (person: NonNullable<MergeView['gone']>) => [
  { term: 'Name', value: person.name },
  { term: 'E-mail', value: person.email },
  { term: 'Institute', value: person.institute || ABSENT },
]

/** Two accounts side by side, what would move from one to the other, and the one button. */
export function MergeSides({ view, email, action }: MergeSidesProps) {
  const router = useRouter()
  const { keep, gone, inTheWay, moves } = view
  if (!gone) return <BarNote tone="not-feasible">No account has the address {email}.</BarNote>
  const run = async (): Promise<string | null> => {
    const answer = await action({ keepId: keep.id, goneId: gone.id })
    if (!answer.ok) return answer.message
    showToast(`${countInWords(answer.data.moved, 'row', 'rows', true)} moved`)
    router.push(paths.officePerson(keep.id))
    return null
  }
  return (
    <>
      {inTheWay.length > 0 ? (
        <div className="mb-6">
          <BarNote tone="not-feasible">
            <p className="m-0 font-semibold">These two cannot be merged as they are</p>
            {inTheWay.map((sentence) => (
              <p key={sentence} className="m-0">
                {sentence}
              </p>
            ))}
          </BarNote>
        </div>
      ) : null}
      <div className="grid gap-x-16 gap-y-8 sm:grid-cols-2 lg:grid-cols-3">
        <Facts title="Stays" facts={facts(keep)} />
        <Facts title="Is given up and shut" facts={facts(gone)} />
        <Facts
          title="Moves"
          facts={
            moves.length > 0
              ? moves.map(({ what, rows }) => ({ term: what, value: formatNumber(rows) }))
              : [{ term: 'Nothing belongs to it', value: ABSENT }]
          }
        />
      </div>
      <div className="mt-8">
        <ConfirmTyped
          trigger="Merge …"
          triggerProps={{
            look: 'primary',
            size: 'regular',
            offReason: inTheWay.length > 0 ? 'see above' : null,
          }}
          title={`Give ${gone.email} up?`}
          expected={gone.email}
          expectedName="the address given up"
          confirm="Merge for good"
          busyWord="Merging"
          onConfirm={run}
        >
          All that is listed moves to {keep.email}, in one go or not at all. It cannot be taken apart again.
        </ConfirmTyped>
      </div>
    </>
  )
}
