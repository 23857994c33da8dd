import { TextLink } from '@/components/ui/TextLink'
import { retirementWords } from './retirementWords'

export interface RecordRetirementProps {
  name: string
  retiredFrom: string | null
  today: string
  /** Where it is said; none for those who may not. */
  href?: string
}

/** Whether something retires, and the way to say so. */
export function RecordRetirement({ name, retiredFrom, today, href }: RecordRetirementProps) {
  if (!retiredFrom && !href) return null
  return (
    <p className="mt-2 flex flex-wrap gap-x-3 text-table text-muted">
      {retiredFrom ? <span>{retirementWords(name, retiredFrom, today)}.</span> : null}
      {href ? <TextLink href={href}>{retiredFrom ? 'Change its retirement' : 'Retire it'}</TextLink> : null}
    </p>
  )
}
