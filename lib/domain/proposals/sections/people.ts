import { countInWords } from '@/lib/format'
import { paths } from '@/lib/paths'
import { leftOut, namedOnSending } from '../namedOnSending'
import type { ProposalContents } from '../types'
import type { Finding, Missing } from './finding'

/** What a kind for students still lacks: one who has agreed, and someone else, who supervises and has agreed. */
function studentLacks({ people, kind }: Pick<ProposalContents, 'people' | 'kind'>): string | null {
  if (!kind.needsStudent) return null
  const agreed = namedOnSending(people)
  const students = agreed.filter(({ isStudent }) => isStudent)
  const isPair = students.some((student) =>
    agreed.some((other) => other !== student && other.isSupervisor && !other.isStudent),
  )
  if (isPair) return null
  const waits = leftOut(people).some(({ isStudent, isSupervisor }) => isStudent || isSupervisor)
  const what = students.length === 0 ? 'a student' : 'the supervisor of the student'
  return `${kind.title}: name ${what}${waits ? ', who must have agreed' : ''}.`
}

/**
 * Someone leads it; a kind for students names a student and a supervisor. Who has yet to agree is left out when it is
 * sent: that is said, and bars nothing.
 */
export function peopleFinding({ people, kind, reference }: ProposalContents): Finding {
  const others = people.filter(({ role }) => role !== 'pi')
  const waiting = leftOut(others).length
  const lead = people.find(({ role }) => role === 'pi')
  const href = paths.proposalSection(reference, 'people')
  const yet = waiting === 0 ? '' : `; ${waiting} ${waiting === 1 ? 'has' : 'have'} yet to agree`
  const lacks = (sentence: string): Missing => ({ section: 'people', field: null, sentence, href })
  const student = studentLacks({ people, kind })
  return {
    begun: true,
    detail:
      others.length === 0
        ? `${lead?.name ?? 'Nobody'} alone`
        : `${lead?.name ?? 'Nobody'} and ${countInWords(others.length, 'co-investigator')}${yet}`,
    missing: [...(lead ? [] : [lacks('Say who leads the proposal.')]), ...(student ? [lacks(student)] : [])],
    settled: others.length > 0 && waiting === 0,
  }
}
