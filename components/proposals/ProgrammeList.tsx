import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import type { ProgrammeLine } from '@/lib/domain/continuation/readProgramme'
import { formatHoursFromSeconds } from '@/lib/format'
import { paths } from '@/lib/paths'
import { stateWords } from './stateWords'

/** The other proposals of the programme that name the reader, with what became of them. */
export function ProgrammeList({ others }: { others: readonly ProgrammeLine[] }) {
  if (others.length === 0) return null
  return (
    <section>
      <SectionHeading dense title="The programme in other calls" />
      <ul className="plain-list mt-2">
        {others.map((line) => (
          <li key={line.reference} className="border-t border-rule py-2 text-table first:border-t-0">
            <TextLink href={paths.proposal(line.reference)}>{line.reference}</TextLink>, call{' '}
            {line.callNumber}: {stateWords(line)}
            {line.awardedSeconds === null ? '' : `, ${formatHoursFromSeconds(line.awardedSeconds)}`}
            <div className="[overflow-wrap:anywhere] text-muted">{line.title}</div>
          </li>
        ))}
      </ul>
    </section>
  )
}
