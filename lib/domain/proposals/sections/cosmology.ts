import { findPreset } from '@/lib/science/cosmology'
import { paths } from '@/lib/paths'
import { cosmologyProblem } from '../cosmologyProblem'
import type { ProposalContents } from '../types'
import type { Finding } from './finding'

/** One always stands there; it must be one the engine can compute with. */
export function cosmologyFinding({ cosmology, reference }: ProposalContents): Finding {
  const beside = cosmology.comparisonId
    ? `; ${findPreset(cosmology.comparisonId).parameters.name} beside it`
    : ''
  const problem = cosmology.id === 'custom' ? cosmologyProblem(cosmology.parameters) : null
  return {
    begun: true,
    detail: `${cosmology.parameters.name}${beside}`,
    missing: problem
      ? [
          {
            section: 'cosmology',
            field: problem.field,
            sentence: problem.sentence,
            href: paths.proposalSection(reference, 'cosmology'),
          },
        ]
      : [],
    wrong: problem !== null,
  }
}
