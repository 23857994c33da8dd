import { TableFrame } from '@/components/tables/TableFrame'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import type { HeldInstrument, HeldMode } from '@/lib/domain/facility/heldModes'
import { ABSENT, formatCalendarDate, formatList, formatNumber, formatPercent } from '@/lib/format'
import { nextInWords, writtenBy } from './recordWords'

const heads: readonly (readonly [head: string, unit?: string])[] = [
  ['Range', 'Å'],
  ['In'],
  ['Resolving power'],
  ['Pixel', 'arcsec'],
  ['Best efficiency'],
  ['Record'],
  ['Since'],
  ['By'],
  ['On offer in'],
]
const numeric = new Set(['Range', 'Resolving power', 'Pixel', 'Best efficiency'])
const align = (head: string) => (numeric.has(head) ? 'is-right' : undefined)

function cellsOf({ now, next, offeredIn }: HeldMode): string[] {
  const { facts } = now
  const best = Math.max(...facts.throughput.map(({ efficiency }) => efficiency))
  return [
    `${formatNumber(facts.wavelengthMinA, 0)} to ${formatNumber(facts.wavelengthMaxA, 0)}`,
    facts.medium,
    facts.resolvingPower === null ? ABSENT : formatNumber(facts.resolvingPower, 0),
    formatNumber(facts.pixelScaleArcsec, 2),
    formatPercent(best, 0),
    `${now.recordVersion}${next ? `; ${nextInWords(next)}` : ''}`,
    formatCalendarDate(now.validFrom),
    writtenBy(now),
    offeredIn.length === 0
      ? 'no call'
      : `${offeredIn.length === 1 ? 'call' : 'calls'} ${formatList(offeredIn.map(String))}`,
  ]
}

export interface InstrumentModesProps {
  instruments: readonly HeldInstrument[]
  today: string
  /** Where the record of a mode is changed. */
  pathOf: (slug: string) => string
  /** Where the retirement of an instrument is said, for those who may. */
  retirementOf?: (slug: string) => string
}

const retirementNote = (retiredFrom: string | null, today: string) =>
  retiredFrom === null
    ? null
    : `${retiredFrom > today ? 'retires on' : 'retired since'} ${formatCalendarDate(retiredFrom)}`

const serviceNote = ({ now, retiredFrom }: HeldMode, today: string) =>
  retirementNote(retiredFrom, today) ??
  (now.validFrom > today ? `begins on ${formatCalendarDate(now.validFrom)}` : null)

function ModeRow({ mode, href, today }: { mode: HeldMode; href: string; today: string }) {
  const note = serviceNote(mode, today)
  return (
    <tr role="row">
      <th role="rowheader" scope="row">
        <TextLink href={href}>{mode.name}</TextLink>
        {note ? <span className="block text-caption font-normal text-muted">{note}</span> : null}
      </th>
      {cellsOf(mode).map((text, index) => {
        const head = heads[index]?.[0] ?? ''
        return (
          <td key={head} role="cell" data-head={head} className={align(head)}>
            {text}
          </td>
        )
      })}
    </tr>
  )
}

/** Modes instrument by instrument: what one chooses by, and which record says so since when. */
export function InstrumentModes({ instruments, today, pathOf, retirementOf }: InstrumentModesProps) {
  return instruments.map(({ slug, name, telescope, retiredFrom, modes }) => (
    <section key={slug} className="mt-10">
      <SectionHeading
        title={name}
        aside={
          <>
            <span>on {telescope}</span>
            {retiredFrom ? <span>{retirementNote(retiredFrom, today)}</span> : null}
            {retirementOf ? (
              <TextLink href={retirementOf(slug)} aria-label={`Retire ${name}`}>
                {retiredFrom ? 'Change' : 'Retire'}
              </TextLink>
            ) : null}
          </>
        }
      />
      <div className="mt-3">
        {modes.length === 0 ? (
          <p className="m-0 text-table text-muted">None of its modes is in service.</p>
        ) : (
          <TableFrame caption={`Modes of ${name}`} phone="cards">
            <thead role="rowgroup">
              <tr role="row">
                <th role="columnheader" scope="col">
                  Mode
                </th>
                {heads.map(([head, unit]) => (
                  <th key={head} role="columnheader" scope="col" className={align(head)}>
                    {head}
                    {unit ? <span className="unit">{unit}</span> : null}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody role="rowgroup">
              {modes.map((mode) => (
                <ModeRow key={mode.slug} mode={mode} href={pathOf(mode.slug)} today={today} />
              ))}
            </tbody>
          </TableFrame>
        )}
      </div>
    </section>
  ))
}
