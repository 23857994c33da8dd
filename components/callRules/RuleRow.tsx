import type { ReactNode } from 'react'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'

interface RuleRowProps {
  name: string
  facts: string
  /** The form under it, while it is open. */
  form: ReactNode
  /** Undefined where nothing can be changed any more. */
  onEdit?: () => void
  onRemove?: () => void
}

/** A kind or a panel in its list: what it is, and the form to change it where one wants to. */
export function RuleRow({ name, facts, form, onEdit, onRemove }: RuleRowProps) {
  return (
    <li className="border-t border-rule py-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <span className="min-w-0">
          <span className="font-semibold">{name}</span>
          <span className="block max-w-prose text-table text-muted">{facts}</span>
        </span>
        {onEdit ? (
          <span className="flex gap-5 text-table">
            <LinkLikeButton onClick={onEdit} aria-label={`Edit ${name}`}>
              Edit
            </LinkLikeButton>
            {onRemove ? (
              <LinkLikeButton onClick={onRemove} aria-label={`Take ${name} off`}>
                Take it off
              </LinkLikeButton>
            ) : null}
          </span>
        ) : null}
      </div>
      {form ? <div className="mt-4 border-l-4 border-accent pl-5">{form}</div> : null}
    </li>
  )
}
