import { TextLink } from '@/components/ui/TextLink'

interface ToolTeaserProps {
  href: string
  name: string
  example: string
  figure: string
  what: string
  children: string
}

/** A tool with one live number. */
export function ToolTeaser({ href, name, example, figure, what, children }: ToolTeaserProps) {
  return (
    <section className="border-t border-ink pt-4">
      <div className="flex items-baseline justify-between gap-4">
        <h2 className="text-section">
          <TextLink href={href}>{name}</TextLink>
        </h2>
        <span className="text-table text-muted">{example}</span>
      </div>
      <p className="mt-4 text-title">{figure}</p>
      <p className="text-table text-muted">{what}</p>
      <p className="mt-3 text-table">{children}</p>
    </section>
  )
}
