import { controlClasses } from '@/components/forms/controlClasses'
import { Button } from '@/components/ui/Button'
import { paths } from '@/lib/paths'

/** Asks which account is the other one. A plain form: looking changes nothing. */
export function MergeForm({ personId, email }: { personId: number; email: string }) {
  return (
    <form method="get" action={paths.officeMerge(personId)} aria-label="The other account">
      <label htmlFor="merge-from" className="block text-body font-semibold">
        E-mail of the other account
      </label>
      <p className="m-0 text-caption text-muted">The one that is given up</p>
      <div className="mt-1 flex flex-wrap items-center gap-4">
        <span className="min-w-0 grow">
          <input
            id="merge-from"
            name="from"
            type="email"
            defaultValue={email}
            className={controlClasses(false, false)}
          />
        </span>
        <Button type="submit" look="secondary">
          See what would move
        </Button>
      </div>
    </form>
  )
}
