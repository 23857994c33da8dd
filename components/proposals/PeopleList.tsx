import { Tag } from '@/components/ui/Tag'
import type { Investigator } from '@/lib/domain/proposals/types'
import { formatDay } from '@/lib/format'
import { accessOptions } from './accessOptions'
import type { PeopleActions } from './peopleActions'
import { PersonTools } from './PersonTools'

export interface PeopleListProps {
  reference: string
  people: readonly Investigator[]
  /** Null for those who only look. */
  actions: PeopleActions | null
}

const wordsOf = (access: Investigator['access']) => accessOptions.find(({ value }) => value === access)?.label

function Standing({ person }: { person: Investigator }) {
  if (person.role === 'pi') return <>principal investigator</>
  if (!person.confirmedAt) return <span className="font-semibold text-lamp">has yet to agree</span>
  return <>agreed on {formatDay(person.confirmedAt)}</>
}

/** Names in their order, with institute, standing and rights. */
export function PeopleList({ reference, people, actions }: PeopleListProps) {
  const last = people.length - 1
  return (
    <ol className="plain-list border-b-[1.5px] border-ink rule-open">
      {people.map((person, index) => (
        <li
          key={person.id}
          className="grid gap-x-6 gap-y-2 border-t border-rule py-3 first:border-t-0 sm:grid-cols-[minmax(0,1fr)_auto]"
        >
          <div className="min-w-0 [overflow-wrap:anywhere]">
            <strong className="font-semibold">{person.name}</strong>{' '}
            {person.isStudent ? <Tag>student</Tag> : null}
            <div className="text-table text-muted">
              {[person.institute, person.email].filter(Boolean).join(', ')}
            </div>
            <div className="text-table">
              <Standing person={person} />
              {person.role === 'pi' || actions ? null : (
                <span className="text-muted">, {wordsOf(person.access)}</span>
              )}
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
