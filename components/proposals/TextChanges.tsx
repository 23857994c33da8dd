import { SectionHeading } from '@/components/ui/SectionHeading'
import type { TextChanges as Changes } from '@/lib/domain/proposals/history/readTextChanges'
import type { WritingPart } from '@/lib/domain/proposals/types'
import type { Difference } from '@/lib/writing/compareTexts'

const names: Readonly<Record<WritingPart, string>> = {
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

/** How the texts went on after a version that was sent. */
export function TextChanges({ from, to, parts }: Changes) {
  return (
    <section className="mt-10">
      <SectionHeading
        dense
        title={`The text, from version ${from} to ${to === null ? 'what stands now' : `version ${to}`}`}
        aside={
          <>
            <del className="bg-tint">struck out: gone</del>
            <ins className="bg-lamp-wash font-semibold no-underline">bold: new</ins>
          </>
        }
      />
      {parts.length === 0 ? (
        <p className="mt-3 text-table text-muted">No text written here differs.</p>
      ) : (
        parts.map(({ part, differences }) => (
          <div key={part} className="mt-4">
            <h3 className="m-0 text-table font-semibold">{names[part]}</h3>
            <p className="m-0 mt-1 max-w-prose text-table [overflow-wrap:anywhere] whitespace-pre-wrap">
              {differences.map((difference, index) => (
                <Piece key={index} {...difference} />
              ))}
            </p>
          </div>
        ))
      )}
    </section>
  )
}
