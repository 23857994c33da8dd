import { LedgerGroup } from '@/components/ui/LedgerGroup'
import { LedgerList } from '@/components/ui/LedgerList'
import { LedgerRow } from '@/components/ui/LedgerRow'
import { SectionState } from '@/components/ui/SectionState'
import type { SectionReport } from '@/lib/domain/proposals/completeness'
import { paths, type ProposalSection } from '@/lib/paths'
import { sectionNames } from './sectionNames'

const questions: readonly (readonly [question: string, sections: readonly ProposalSection[]])[] = [
  ['What is the question?', ['question', 'papers']],
  ['Where is it?', ['targets', 'cosmology']],
  ['What must be measured?', ['observing']],
  ['Can it be done?', ['feasibility']],
  ['Who asks?', ['people']],
  ['Read it through and send', ['send']],
]

export interface TaskListProps {
  reference: string
  sections: readonly SectionReport[]
}

/** The whole proposal as six questions, each with what stands there and how far it is. */
export function TaskList({ reference, sections }: TaskListProps) {
  const reportOf = (section: ProposalSection) => sections.find((report) => report.section === section)
  return (
    <LedgerList>
      {questions.map(([question, names]) => (
        <LedgerGroup key={question} title={question}>
          {names.flatMap((name) => {
            const report = reportOf(name)
            if (!report) return []
            return (
              <LedgerRow
                key={name}
                label={sectionNames[name]}
                href={
                  report.state === 'waits' && name === 'send'
                    ? undefined
                    : paths.proposalSection(reference, name)
                }
                aside={<SectionState state={report.state} waitsFor={report.waitsFor ?? undefined} />}
              >
                {report.detail}
              </LedgerRow>
            )
          })}
        </LedgerGroup>
      ))}
    </LedgerList>
  )
}
