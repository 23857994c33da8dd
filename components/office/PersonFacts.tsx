import { Facts } from '@/components/ui/Facts'
import { TextLink } from '@/components/ui/TextLink'
import type { PersonView } from '@/lib/domain/people/personView'
import { ABSENT, formatNumber, formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'

const when = (at: string | null) => (at ? formatUtcWithYear(new Date(at)) : ABSENT)
const number = (n: number) => formatNumber(n, 0)

/** An account in facts: address, dates, and what it has left in the product. */
export function PersonFacts({ person }: { person: PersonView }) {
  const { traces } = person
  return (
    <>
      <Facts
        title="Account"
        facts={[
          { term: 'E-mail', value: person.email },
          { term: 'ORCID iD', value: person.orcid ?? ABSENT },
          { term: 'Opened', value: when(person.createdAt) },
          { term: 'Address proved', value: when(person.confirmedAt) },
          { term: 'Last used', value: when(traces.lastSeenAt) },
        ]}
      />
      <Facts
        title="What it holds"
        facts={[
          { term: 'Proposals', value: number(traces.proposals) },
          { term: 'of these sent', value: number(traces.sent) },
          { term: 'Reviews', value: number(traces.reviews) },
          { term: 'Assessments', value: number(traces.assessments) },
          { term: 'Letters', value: number(traces.letters) },
        ]}
      />
      <p className="m-0 flex flex-wrap gap-x-5 gap-y-2 text-table">
        {person.mergedInto || person.erasedAt ? null : (
          <TextLink href={paths.officeMerge(person.id)}>The same person twice? Merge</TextLink>
        )}
        <TextLink href={`${paths.office('logbook')}?person=${person.id}`}>What they did</TextLink>
        <TextLink href={`${paths.office('logbook')}?kind=person&id=${person.id}`}>
          What was done to it
        </TextLink>
      </p>
    </>
  )
}
