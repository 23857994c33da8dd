import { CarriedNotes } from '@/components/proposals/CarriedNotes'
import type { ProposalSection } from '@/lib/paths'
import { programmeOf } from './programmeOf'

/** At the top of a section: what is not as it was in the call this proposal was carried on from. */
export async function CarriedHere({ reference, section }: { reference: string; section: ProposalSection }) {
  const { notes, continues } = await programmeOf(reference)
  const here = notes.filter((note) => note.section === section)
  if (!continues || here.length === 0) return null
  return (
    <div className="mb-6 max-w-prose">
      <CarriedNotes notes={here} callNumber={continues.callNumber} />
    </div>
  )
}
