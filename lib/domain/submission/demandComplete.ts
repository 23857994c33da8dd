import { refuse } from '@/lib/errors'
import type { ProposalComputation } from '../observations/types'
import { completeness, everythingMissing } from '../proposals/completeness'
import type { ProposalContents } from '../proposals/types'

/** Refuses with everything that is missing, section by section; otherwise gives the document that is sent, or null where the text is. */
export function demandComplete(contents: ProposalContents, computation: ProposalComputation): number | null {
  const reports = completeness(contents, computation)
  const missing = everythingMissing(reports)
  if (missing.length === 0) return contents.papers.find(({ kind }) => kind === 'justification')?.id ?? null
  const fieldErrors: Record<string, string> = {}
  for (const report of reports)
    for (const { sentence } of report.missing) fieldErrors[report.section] ??= sentence
  throw refuse.invalid('Something is missing before this can be sent. Nothing was sent.', fieldErrors)
}
