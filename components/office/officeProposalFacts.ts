import type { Fact } from '@/components/ui/Facts'
import type { OfficeProposalView } from '@/lib/domain/calls/readOfficeProposal'
import { ABSENT, formatList, formatUtcWithYear } from '@/lib/format'
import { stateWords } from './stateWords'

/** What the office sees of one proposal at a glance. */
export function officeProposalFacts({ contents, deadline, versions }: OfficeProposalView): Fact[] {
  const leads = contents.people.filter(({ role }) => role === 'pi').map(({ name }) => name)
  const standing = versions.find(({ stands }) => stands)
  return [
    { term: 'Stands', value: stateWords(contents.isReopened ? 'reopened' : contents.state) },
    { term: 'Kind', value: contents.kind.title },
    { term: 'Led by', value: leads.length > 0 ? formatList(leads) : ABSENT },
    {
      term: contents.closesAt ? 'Closes, by its own deadline' : 'Closes',
      value: formatUtcWithYear(deadline),
    },
    { term: 'Arrived', value: standing ? formatUtcWithYear(standing.arrivedAt) : ABSENT },
    ...contents.papers.map(({ kind, fileName }) => ({
      term: kind === 'justification' ? 'Justification' : 'The team',
      value: fileName,
    })),
  ]
}
