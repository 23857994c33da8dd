import { useId, type ReactNode } from 'react'
import { controlClasses } from '@/components/forms/controlClasses'
import { Button } from '@/components/ui/Button'
import { TextLink } from '@/components/ui/TextLink'
import type { LogbookFilterInput } from '@/lib/domain/logbook/schema'
import { paths } from '@/lib/paths'

interface LogbookFilterFormProps {
  filter: LogbookFilterInput
  /** Why the filter in the address was not used. */
  problem: string | null
  actions: readonly string[]
  subjects: readonly string[]
}

function Labelled({ label, children }: { label: string; children: (id: string) => ReactNode }) {
  const id = useId()
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="block text-caption text-muted">
        {label}
      </label>
      {children(id)}
    </div>
  )
}

const control = `${controlClasses(false, false)} text-table`

/** What of the logbook is shown. A plain form: the filter stands in the address, and a link shows the same rows. */
export function LogbookFilterForm({ filter, problem, actions, subjects }: LogbookFilterFormProps) {
  const isNarrowed = Object.values(filter).some(Boolean)
  return (
    <form method="get" action={paths.office('logbook')} aria-label="Narrow the logbook">
      {problem ? (
        <p role="alert" className="mb-3 text-table font-semibold text-not-feasible">
          {problem} All rows are shown.
        </p>
      ) : null}
      {filter.person ? <input type="hidden" name="person" value={filter.person} /> : null}
      <div className="grid grid-cols-2 items-end gap-4 sm:grid-cols-4 lg:grid-cols-7">
        <Labelled label="Who">
          {(id) => <input id={id} name="who" type="search" defaultValue={filter.who} className={control} />}
        </Labelled>
        <Labelled label="What">
          {(id) => (
            <select id={id} name="action" defaultValue={filter.action} className={control}>
              <option value="">everything</option>
              <option value="-sign-in">all but signing in</option>
              {actions.map((action) => (
                <option key={action}>{action}</option>
              ))}
            </select>
          )}
        </Labelled>
        <Labelled label="Of what">
          {(id) => (
            <select id={id} name="kind" defaultValue={filter.kind} className={control}>
              <option value="">anything</option>
              {subjects.map((kind) => (
                <option key={kind}>{kind}</option>
              ))}
            </select>
          )}
        </Labelled>
        <Labelled label="Its key or number">
          {(id) => <input id={id} name="id" defaultValue={filter.id} className={control} />}
        </Labelled>
        <Labelled label="From address">
          {(id) => <input id={id} name="from" defaultValue={filter.from} className={control} />}
        </Labelled>
        <Labelled label="First day, UTC">
          {(id) => <input id={id} name="since" type="date" defaultValue={filter.since} className={control} />}
        </Labelled>
        <Labelled label="Last day, UTC">
          {(id) => <input id={id} name="until" type="date" defaultValue={filter.until} className={control} />}
        </Labelled>
      </div>
      <div className="mt-4 flex flex-wrap items-center gap-5 text-table">
        <Button type="submit" look="secondary" size="small">
          Show these rows
        </Button>
        {isNarrowed ? <TextLink href={paths.office('logbook')}>Show all</TextLink> : null}
      </div>
    </form>
  )
}
