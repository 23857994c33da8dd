import { SectionHeading } from '@/components/ui/SectionHeading'
import type { VersionChanges } from '@/lib/domain/proposals/history/readVersionChanges'
import type { Difference } from '@/lib/writing/compareTexts'
import { ThingChanges } from './ThingChanges'

const names: Readonly<Record<VersionChanges['parts'][number]['part'], string>> = {
  abstract: 'Abstract',
  justification: 'Justification',
  references: 'References',
  team: 'On the team',
}
const longest = 240

/** What stayed is shortened to its ends: the changes are what is looked for. */
function shortened(text: string): string {
  return text.length > longest ? `${text.slice(0, 100)} … ${text.slice(-100)}` : text
}

function Piece({ kind, text }: Difference) {
  if (kind === 'gone') return <del className="bg-tint text-muted">{text}</del>
  if (kind === 'new') return <ins className="bg-lamp-wash font-semibold no-underline">{text}</ins>
  return shortened(text)
}

/** How a proposal went on after a version that was sent: field by field, then text by text. */
export function VersionChangesView({ parts, ...fields }: VersionChanges) {
  const { from, to } = fields
  return (
    <section>
      <SectionHeading
        dense
        title={`From version ${from} to ${to === null ? 'what stands now' : `version ${to}`}`}
      />
      {parts.length > 0 || fields.things.length > 0 ? (
        <ThingChanges {...fields} />
      ) : (
        <p className="mt-3 text-table text-muted">Nothing differs.</p>
      )}
      {parts.length > 0 ? (
        <p className="m-0 mt-6 text-caption text-muted">
          In texts, <del className="bg-tint">struck out</del> is gone and{' '}
          <ins className="bg-lamp-wash font-semibold no-underline">bold</ins> is new.
        </p>
      ) : null}
      {parts.map(({ part, differences }) => (
        <div key={part} className="mt-4">
          <h3 className="m-0 text-table font-semibold">{names[part]}</h3>
          <p className="m-0 mt-1 max-w-prose text-table [overflow-wrap:anywhere] whitespace-pre-wrap">
            {differences.map((difference, index) => (
              <Piece key={index} {...difference} />
            ))}
          </p>
        </div>
      ))}
    </section>
  )
}
