import { BarNote } from '@/components/ui/BarNote'
import { Facts } from '@/components/ui/Facts'
import { TextLink } from '@/components/ui/TextLink'
import type { LetterView } from '@/lib/domain/outbox/letterView'
import { ABSENT, formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { letterStands } from './letterStands'

const when = (at: string | null) => (at ? formatUtcInstant(new Date(at)) : ABSENT)

/** How a letter stands: when it was written and taken, how often it was tried, and what the mail server said. */
export function LetterFacts({ letter }: { letter: LetterView }) {
  return (
    <>
      <Facts
        title="How it stands"
        facts={[
          { term: 'Stands', value: letterStands[letter.state] },
          { term: 'Address', value: letter.toEmail },
          { term: 'Written', value: when(letter.createdAt) },
          { term: 'Taken by the mail server', value: when(letter.sentAt) },
          { term: 'Tries', value: String(letter.attempts) },
          { term: 'Letter', value: letter.template },
        ]}
      />
      {letter.lastError ? (
        <BarNote tone={letter.state === 'queued' ? 'marginal' : 'not-feasible'}>
          The mail server said: “{letter.lastError}”
        </BarNote>
      ) : null}
      <p className="m-0 flex flex-wrap gap-x-5 gap-y-2 text-table">
        {letter.personId === null ? null : (
          <TextLink href={paths.officePerson(letter.personId)}>Their account</TextLink>
        )}
        {letter.againOf === null ? null : (
          <TextLink href={paths.officeLetter(letter.againOf)}>The first of it</TextLink>
        )}
        <TextLink href={`${paths.office('logbook')}?kind=letter&id=${letter.id}`}>Logbook</TextLink>
      </p>
    </>
  )
}
