import { paths } from '@/lib/paths'
import { groupInBrief } from '../../observations/groupWords'
import { isSpared } from '../../observations/isSpared'
import type { GroupComputation, ProposalComputation } from '../../observations/types'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

/** Few groups are told one by one, many by how many of them hold. */
function groupsInBrief(groups: readonly GroupComputation[]): string[] {
  if (groups.length <= 2) return groups.map((group) => `${group.name}: ${groupInBrief(group)}`)
  const holding = groups.filter(({ verdict }) => verdict === 'feasible').length
  return [`${holding} of ${groups.length} groups feasible`]
}

/**
 * Nothing computed as not feasible stands unanswered: it is mended, or the author says that it is meant so.
 * A target that its group can spare, and a backup, ask for no answer. The instrument scientists have the last word, so a verdict alone never bars a proposal.
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
  const failing = computation.observations.filter(
    (one) => one.verdict === 'not-feasible' && !isSpared(one, contents, computation),
  )
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
    detail: [`${checksClear} of ${checksTotal} checks clear`, ...groupsInBrief(computation.groups)].join(
      '; ',
    ),
    missing: isAnswered ? [] : found,
    wrong: found.length > 0 && !isAnswered,
    settled: found.length === 0,
  }
}
