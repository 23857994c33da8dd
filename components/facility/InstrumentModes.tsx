import { TableFrame } from '@/components/tables/TableFrame'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { TextLink } from '@/components/ui/TextLink'
import type { HeldMode } from '@/lib/domain/facility/heldModes'
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
  modes: readonly HeldMode[]
  /** Where the record of a mode is changed. */
  pathOf: (slug: string) => string
}

/** Modes instrument by instrument: what one chooses by, and which record says so since when. */
export function InstrumentModes({ modes, pathOf }: InstrumentModesProps) {
  const instruments = [...new Map(modes.map((mode) => [mode.instrument.id, mode])).values()]
  return instruments.map(({ instrument, telescope }) => (
    <section key={instrument.id} className="mt-10">
      <SectionHeading title={instrument.name} aside={`on ${telescope}`} />
      <div className="mt-3">
        <TableFrame caption={`Modes of ${instrument.name}`} phone="cards">
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
            {modes
              .filter((mode) => mode.instrument.id === instrument.id)
              .map((mode) => (
                <tr key={mode.slug} role="row">
                  <th role="rowheader" scope="row">
                    <TextLink href={pathOf(mode.slug)}>{mode.name}</TextLink>
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
              ))}
          </tbody>
        </TableFrame>
      </div>
    </section>
  ))
}
