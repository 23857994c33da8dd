import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { CarriedNote } from '@/lib/domain/continuation/types'
import { paths } from '@/lib/paths'
import { sectionNames } from './sectionNames'

export interface CarriedNotesProps {
  notes: readonly CarriedNote[]
  /** The call it was carried on from. */
  callNumber: number
  /** With it each note says where it is mended, and links there. */
  reference?: string
}

/** What has changed since the earlier call, and what to do about each. */
export function CarriedNotes({ notes, callNumber, reference }: CarriedNotesProps) {
  return (
    <BarNote tone="lamp">
      <p className="m-0 font-semibold">Since call {callNumber}</p>
      <ul className="plain-list mt-1 flex flex-col gap-2">
        {notes.map(({ section, sentence, todo }) => (
          <li key={`${section} ${sentence}`}>
            {reference ? (
              <>
                <TextLink href={paths.proposalSection(reference, section)}>{sectionNames[section]}</TextLink>
                :{' '}
              </>
            ) : null}
            {sentence} <span className="font-semibold">{todo}</span>
          </li>
        ))}
      </ul>
    </BarNote>
  )
}
