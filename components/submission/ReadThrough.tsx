import { LedgerGroup } from '@/components/ui/LedgerGroup'
import { LedgerList } from '@/components/ui/LedgerList'
import { LedgerRow } from '@/components/ui/LedgerRow'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { Verdict } from '@/lib/domain/observations/types'
import type { ReadThroughGroup } from '@/lib/domain/submission/readThrough'
import { paths } from '@/lib/paths'

interface ReadThroughProps {
  reference: string
  groups: readonly ReadThroughGroup[]
  verdict: Verdict | null
  /** No edit links once it is in. */
  readOnly: boolean
}

/** Everything the proposal says, in ledger form, each row with the way to change it. */
export function ReadThrough({ reference, groups, verdict, readOnly }: ReadThroughProps) {
  return (
    <LedgerList>
      {groups.map((group) => (
        <LedgerGroup key={group.question} title={group.question}>
          {group.rows.map((row) => (
            <LedgerRow
              key={row.label}
              label={row.label}
              aside={
                readOnly ? null : (
                  <TextLink href={paths.proposalSection(reference, row.section)}>
                    Edit<span className="sr-only"> {row.label.toLowerCase()}</span>
                  </TextLink>
                )
              }
            >
              <span className="text-body text-ink">
                {row.label === 'Verdict' && verdict ? (
                  <span className="mr-3">
                    <VerdictMark verdict={verdict} />
                  </span>
                ) : null}
                {row.text}
              </span>
            </LedgerRow>
          ))}
        </LedgerGroup>
      ))}
    </LedgerList>
  )
}
