import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { RetirementPage } from '@/lib/domain/facility/readRetirement'
import { offeredWords } from '@/lib/domain/facility/rules'
import { countInWords, formatCalendarDate, formatList } from '@/lib/format'
import { paths } from '@/lib/paths'
import { retirementWords } from './retirementWords'

function goingWords({ kind, modeCount, instruments }: RetirementPage): string {
  if (modeCount === 0) return 'No mode goes with it.'
  const modes = countInWords(modeCount, 'mode', 'modes', true)
  const verb = modeCount === 1 ? 'goes' : 'go'
  return `${modes} ${verb} with it${kind === 'instrument' ? '' : `, of ${formatList(instruments)}`}.`
}

/** What goes with it, which calls stand in the way, and which keep what they have. */
export function RetirementFacts({ page }: { page: RetirementPage }) {
  const { kind, name, offers, retiredFrom, goesWithCarrier, today } = page
  const open = offers.filter(({ isOpen }) => isOpen)
  const closed = offers.filter(({ isOpen }) => !isOpen)
  return (
    <div className="flex max-w-prose flex-col gap-4">
      {retiredFrom ? <p className="m-0 font-semibold">{retirementWords(name, retiredFrom, today)}.</p> : null}
      {goesWithCarrier ? (
        <p className="m-0">It goes on {formatCalendarDate(goesWithCarrier)} with what carries it.</p>
      ) : null}
      {kind === 'mode' ? null : <p className="m-0">{goingWords(page)}</p>}
      {open.length > 0 ? (
        <BarNote tone="lamp">
          {open.map((call) => (
            <p key={call.number} className="m-0">
              <TextLink href={paths.officeCall(call.slug)}>{`Call ${call.number}`}</TextLink> offers{' '}
              {kind === 'mode' ? 'it' : offeredWords(call.modes)} to {formatCalendarDate(call.seasonTo)}: it
              retires later, or comes off that offer first.
            </p>
          ))}
        </BarNote>
      ) : null}
      {closed.map((call) => (
        <p key={call.number} className="m-0">
          Call {call.number} has closed and keeps what it offered to {formatCalendarDate(call.seasonTo)}.
        </p>
      ))}
    </div>
  )
}
