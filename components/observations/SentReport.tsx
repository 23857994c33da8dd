import { EmptyState } from '@/components/ui/EmptyState'
import { underCosmology } from '@/lib/domain/observations/rules'
import type { AnonymousProposal } from '@/lib/domain/packets/types'
import { FeasibilityReport } from './FeasibilityReport'
import { OtherCosmologies } from './OtherCosmologies'
import type { AssessmentAbove } from './StandsAbove'

export interface SentReportProps {
  proposal: AnonymousProposal
  assessments: readonly AssessmentAbove[]
  /** The address of this report without its query. */
  here: string
  query: { observation?: string; under?: string }
}

/** The report a proposal was sent with, for those who judge it: the same pictures, nobody's name, under any cosmology. */
export function SentReport({ proposal, assessments, here, query }: SentReportProps) {
  if (proposal.observations.length === 0)
    return <EmptyState title="No hours are asked for">There is nothing to check.</EmptyState>
  const { computation } = proposal
  const other = query.under ? underCosmology(proposal, computation, query.under) : null
  const chosen = Number(query.observation) || null
  return (
    <FeasibilityReport
      contents={other?.contents ?? proposal}
      computation={other?.computation ?? computation}
      chosen={chosen}
      hrefOf={(id) => `${here}?observation=${id}${other ? `&under=${other.id}` : ''}`}
      assessments={assessments}
      aside={
        <OtherCosmologies
          here={`${here}?observation=${chosen ?? ''}`}
          own={computation.cosmologyName}
          engineVersion={computation.engineVersion}
          other={other ? { id: other.id, name: other.name, flips: other.flips } : null}
        />
      }
    />
  )
}
