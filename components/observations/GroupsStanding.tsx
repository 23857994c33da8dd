import { SectionHeading } from '@/components/ui/SectionHeading'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import { GroupLine } from './GroupLine'

/** The verdict of the whole by the rules of its groups, one sentence each; nothing where there is no group. */
export function GroupsStanding({
  computation,
}: {
  computation: Pick<ProposalComputation, 'groups' | 'verdict'>
}) {
  const { groups, verdict } = computation
  if (groups.length === 0) return null
  return (
    <section>
      <SectionHeading
        dense
        title="The whole, by its groups"
        aside={
          verdict ? (
            <VerdictMark
              verdict={verdict}
              strong
              words={`The whole is computed ${verdict.replace('-', ' ')}`}
            />
          ) : null
        }
      />
      <ul className="plain-list mt-2">
        {groups.map((group) => (
          <li key={group.name} className="border-t border-rule py-2">
            <GroupLine group={group} />
          </li>
        ))}
      </ul>
    </section>
  )
}
