import { TextLink } from './TextLink'

export interface BreadcrumbProps {
  /** From the outside in; the last is where one stands and is no link. */
  steps: { label: string; href?: string }[]
}

/** Where this page stands, above its title. */
export function Breadcrumb({ steps }: BreadcrumbProps) {
  return (
    <nav aria-label="Breadcrumb" className="mb-1 text-table text-muted">
      <ol className="plain-list flex flex-wrap gap-x-2">
        {steps.map((step, index) => (
          <li key={step.label} className="flex gap-2">
            {index > 0 ? <span aria-hidden="true">/</span> : null}
            {step.href ? (
              <TextLink href={step.href}>{step.label}</TextLink>
            ) : (
              <span aria-current={index === steps.length - 1 ? 'page' : undefined}>{step.label}</span>
            )}
          </li>
        ))}
      </ol>
    </nav>
  )
}
