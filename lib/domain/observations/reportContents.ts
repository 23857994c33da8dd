import type { Call } from '../calls/types'
import type { ProposalContents } from '../proposals/types'

/** What numbers are computed from: no people, no papers, so that an anonymous proposal serves as well. */
export type ReportContents = Pick<
  ProposalContents,
  'site' | 'modes' | 'groups' | 'targets' | 'constraintSets' | 'observations' | 'cosmology'
> & { call: Pick<Call, 'seasonFrom' | 'seasonTo'> }
