import { paths } from '@/lib/paths'
import type { ProposalComputation } from '../../observations/types'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

/**
 * Nothing computed as not feasible stands unanswered: it is mended, or the author says that it is meant so.
 * The instrument scientists have the last word, so a verdict alone never bars a proposal.
 */
export function feasibilityFinding(contents: ProposalContents, computation: ProposalComputation): Finding {
  const { targets, reference, sectionsDone } = contents
  const href = paths.proposalSection(reference, 'feasibility')
  if (contents.observations.length === 0)
    return {
      begun: false,
      detail: 'Checked once there is something to observe',
      missing: [],
      waitsFor: 'observing',
    }
  const nameOf = (targetId: number) => targets.find(({ id }) => id === targetId)?.name ?? 'A target'
  const failing = computation.observations.filter(({ verdict }) => verdict === 'not-feasible')
  const found = failing.map(({ observationId, targetId, checks }): Missing => {
    const check = checks.find(({ verdict }) => verdict === 'not-feasible')
    return {
      section: 'feasibility',
      field: `observation-${observationId}`,
      sentence: `${nameOf(targetId)}: ${check?.why ?? 'the checks say that it cannot be done.'}`,
      href: `${href}#observation-${observationId}`,
    }
  })
  const isAnswered = sectionsDone.includes('feasibility')
  const { checksClear, checksTotal } = computation
  return {
    begun: true,
    detail: `${checksClear} of ${checksTotal} checks clear`,
    missing: isAnswered ? [] : found,
    wrong: found.length > 0 && !isAnswered,
    settled: found.length === 0,
  }
}
