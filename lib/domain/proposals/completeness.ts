import type { ProposalSection } from '@/lib/paths'
import type { ProposalComputation } from '../observations/types'
import { isOpenForWriting } from './policy'
import { cosmologyFinding } from './sections/cosmology'
import { feasibilityFinding } from './sections/feasibility'
import type { Finding, Missing } from './sections/finding'
import { observingFinding } from './sections/observing'
import { papersFinding } from './sections/papers'
import { peopleFinding } from './sections/people'
import { questionFinding } from './sections/question'
import { targetsFinding } from './sections/targets'
import type { ProposalContents } from './types'

export type SectionStateName = 'done' | 'begun' | 'needs-you' | 'waits'

export interface SectionReport {
  section: ProposalSection
  state: SectionStateName
  /** For `waits`. */
  waitsFor: ProposalSection | null
  /** What stands there, in a few words. */
  detail: string
  missing: Missing[]
}

const rules: readonly [ProposalSection, (c: ProposalContents, k: ProposalComputation) => Finding][] = [
  ['question', questionFinding],
  ['papers', papersFinding],
  ['targets', targetsFinding],
  ['cosmology', cosmologyFinding],
  ['observing', observingFinding],
  ['feasibility', feasibilityFinding],
  ['people', peopleFinding],
]

/** Done when nothing is missing and the author says so; needs you when untouched or wrong. */
function stateOf(finding: Finding, isMarked: boolean): SectionStateName {
  if (finding.waitsFor) return 'waits'
  if (finding.missing.length === 0) return isMarked || finding.settled ? 'done' : 'begun'
  return finding.begun && !finding.wrong && !isMarked ? 'begun' : 'needs-you'
}

function sendReport(contents: ProposalContents, reports: readonly SectionReport[]): SectionReport {
  const waitsFor = reports.find(({ missing }) => missing.length > 0)?.section ?? null
  const isSent = !isOpenForWriting(contents)
  const isAgain = contents.isReopened ? 'Reopened: what was sent stands until it is sent again' : null
  return {
    section: 'send',
    state: isSent ? 'done' : waitsFor ? 'waits' : 'begun',
    waitsFor: isSent ? null : waitsFor,
    detail: isSent
      ? 'Sent'
      : (isAgain ?? (waitsFor ? 'Opens when nothing above is unsettled' : 'Everything is there to be sent')),
    missing: [],
  }
}

/**
 * How far each section is, in the order of the task list, `send` last. The same rules decide whether a proposal
 * may be sent: it may when no section has anything missing.
 */
export function completeness(contents: ProposalContents, computation: ProposalComputation): SectionReport[] {
  const reports = rules.map(([section, rule]): SectionReport => {
    const finding = rule(contents, computation)
    return {
      section,
      state: stateOf(finding, contents.sectionsDone.includes(section)),
      waitsFor: finding.waitsFor ?? null,
      // What is wrong is worth more than what stands there.
      detail: (finding.wrong ? finding.missing[0]?.sentence : null) ?? finding.detail,
      missing: finding.missing,
    }
  })
  return [...reports, sendReport(contents, reports)]
}

/** Everything that stands between the proposal and being sent, in the order of the task list. */
export const everythingMissing = (reports: readonly SectionReport[]): Missing[] =>
  reports.flatMap(({ missing }) => missing)
