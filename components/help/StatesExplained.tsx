import { SectionState } from '@/components/ui/SectionState'
import { SignEntry } from './SignEntry'

/** How far a section of a proposal is, and what became of the proposal. */
export function StatesExplained() {
  return (
    <>
      <SignEntry sign={<SectionState state="done" />}>You said so, and nothing in it is missing.</SignEntry>
      <SignEntry sign={<SectionState state="begun" />}>
        Something is written; you have not said that it is done.
      </SignEntry>
      <SignEntry sign={<SectionState state="needs-you" />}>
        Something stands in the way of sending it.
      </SignEntry>
      <SignEntry sign={<SectionState state="waits" waitsFor="feasibility" />}>
        Opens by itself once the section it names is done.
      </SignEntry>
      <SignEntry sign="awarded, reserve, declined">
        The panel’s decision, known to you from the day the letters go out. Reserve gets the hours that others
        leave.
      </SignEntry>
    </>
  )
}
