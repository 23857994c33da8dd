import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { PersonView } from '@/lib/domain/people/personView'
import { formatUtcWithYear } from '@/lib/format'
import { paths } from '@/lib/paths'

const when = (at: string) => formatUtcWithYear(new Date(at))

/** What the office must know before it does anything with an account: a sentence each, nothing when all is well. */
export function PersonStanding({ person }: { person: PersonView }) {
  return (
    <div className="mt-6 flex flex-col gap-3 empty:hidden">
      {person.mergedInto ? (
        <BarNote tone="accent">
          This account was merged into{' '}
          <TextLink href={paths.officePerson(person.mergedInto.id)}>{person.mergedInto.name}</TextLink>. All
          that was its own stands there.
        </BarNote>
      ) : null}
      {person.erasedAt ? (
        <BarNote tone="accent">
          What spoke of this person was erased on {when(person.erasedAt)}. What has to be kept stays.
        </BarNote>
      ) : null}
      {person.addressFailedAt ? (
        <BarNote tone="not-feasible">
          Letters do not reach {person.email}: on {when(person.addressFailedAt)} the mail server said “
          {person.addressFailedWhy}”. The mark goes as soon as a letter is taken.
        </BarNote>
      ) : null}
      {person.erasureAskedAt && !person.erasedAt ? (
        <BarNote tone="lamp">
          {person.name} asked on {when(person.erasureAskedAt)} to be erased. See “Personal data” below.
        </BarNote>
      ) : null}
      {person.disabledAt && !person.mergedInto && !person.erasedAt ? (
        <BarNote tone="marginal">Shut since {when(person.disabledAt)}: nobody signs in with it.</BarNote>
      ) : null}
      {person.confirmedAt || person.erasedAt ? null : (
        <BarNote tone="marginal">The address has not been proved yet: nobody signs in with it.</BarNote>
      )}
    </div>
  )
}
