import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import type { ProposalContents } from '../types'
import type { Finding } from './finding'

/** Everyone has a name and the principal investigator an institute. Who has yet to agree is said, and bars nothing. */
export function peopleFinding({ people, reference }: ProposalContents): Finding {
  const others = people.filter(({ role }) => role !== 'pi')
  const waiting = others.filter(({ confirmedAt }) => confirmedAt === null)
  const lead = people.find(({ role }) => role === 'pi')
  const href = paths.proposalSection(reference, 'people')
  const yet =
    waiting.length === 0 ? '' : `; ${waiting.length} ${waiting.length === 1 ? 'has' : 'have'} yet to agree`
  return {
    begun: true,
    detail:
      others.length === 0
        ? `${lead?.name ?? 'Nobody'} alone`
        : `${lead?.name ?? 'Nobody'} and ${countInWords(others.length, 'co-investigator')}${yet}`,
    missing: lead ? [] : [{ section: 'people', field: null, sentence: 'Say who leads the proposal.', href }],
    settled: others.length > 0 && waiting.length === 0,
  }
}
