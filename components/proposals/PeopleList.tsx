import { Tag } from '@/components/ui/Tag'
import type { Investigator } from '@/lib/domain/proposals/types'
import { formatDay } from '@/lib/format'
import { accessOptions } from './accessOptions'
import { AskToLead, type AskToLeadProps } from './AskToLead'
import { OrcidMark } from './OrcidMark'
import type { PeopleActions } from './peopleActions'
import { PersonDetails } from './PersonDetails'
import { PersonTools } from './PersonTools'

export interface PeopleListProps {
  reference: string
  people: readonly Investigator[]
  /** Null for those who only look. */
  actions: PeopleActions | null
  /** Null for those who cannot ask anyone to lead, and while somebody is asked. */
  offerLead: AskToLeadProps['offer'] | null
}

const wordsOf = (access: Investigator['access']) => accessOptions.find(({ value }) => value === access)?.label

function Standing({ person }: { person: Investigator }) {
  if (person.role === 'pi') return <>principal investigator</>
  if (!person.confirmedAt) return <span className="font-semibold text-lamp">has yet to agree</span>
  return <>agreed on {formatDay(person.confirmedAt)}</>
}

function Facts({ person, withRights }: { person: Investigator; withRights: boolean }) {
  return (
    <>
      <strong className="font-semibold">{person.name}</strong> {person.isStudent ? <Tag>student</Tag> : null}{' '}
      {person.isSupervisor ? <Tag>supervisor</Tag> : null}
      <div className="text-table text-muted">
        {[person.institute, person.email].filter(Boolean).join(', ')}
      </div>
      {person.orcid ? (
        <div className="text-table">
          <OrcidMark orcid={person.orcid} isVerified={person.isOrcidVerified} />
        </div>
      ) : null}
      <div className="text-table">
        <Standing person={person} />
        {withRights ? <span className="text-muted">, {wordsOf(person.access)}</span> : null}
      </div>
    </>
  )
}

/** Names in their order, with institute, ORCID iD, standing and rights. */
export function PeopleList({ reference, people, actions, offerLead }: PeopleListProps) {
  const last = people.length - 1
  return (
    <ol className="plain-list border-b-[1.5px] border-ink rule-open">
      {people.map((person, index) => (
        <li
          key={person.id}
          className="grid gap-x-6 gap-y-2 border-t border-rule py-3 first:border-t-0 sm:grid-cols-[minmax(0,1fr)_auto]"
        >
          <div className="min-w-0 [overflow-wrap:anywhere]">
            <Facts person={person} withRights={person.role !== 'pi' && !actions} />
            <div className="mt-1 flex flex-wrap items-center gap-x-5 gap-y-1 text-table empty:hidden">
              {actions ? (
                <PersonDetails
                  reference={reference}
                  person={person}
                  hasAgreed={person.confirmedAt !== null}
                  describe={actions.describe}
                />
              ) : null}
              {offerLead && person.role !== 'pi' && person.confirmedAt ? (
                <AskToLead
                  reference={reference}
                  person={{ id: person.id, name: person.name }}
                  offer={offerLead}
                />
              ) : null}
            </div>
          </div>
          {actions && person.role !== 'pi' ? (
            <PersonTools
              reference={reference}
              person={{ id: person.id, name: person.name, access: person.access }}
              isFirst={people[index - 1]?.role === 'pi'}
              isLast={index === last}
              actions={actions}
            />
          ) : null}
        </li>
      ))}
    </ol>
  )
}
