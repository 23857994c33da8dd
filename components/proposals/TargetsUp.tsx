import { ChartFrame } from '@/components/charts/ChartFrame'
import { UpBars } from '@/components/charts/UpBars'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { pointingOf } from '@/lib/domain/facility/rules'
import type { ReadProposal } from '@/lib/domain/proposals/readProposal'
import { formatHours } from '@/lib/format'
import { limitWords } from '@/lib/science/feasibility'
import { monthName, seasonMonths } from './seasonMonths'

/** The worst word said about a target's observations, for the colour of its row. */
function toneOf(read: ReadProposal, targetId: number): 'marginal' | 'not-feasible' | undefined {
  const verdicts = read.computation.observations
    .filter((observation) => observation.targetId === targetId)
    .map(({ verdict }) => verdict)
  return verdicts.includes('not-feasible')
    ? 'not-feasible'
    : verdicts.includes('marginal')
      ? 'marginal'
      : undefined
}

/** Dark hours a night of every target with a position, through the season of the call. */
export function TargetsUp({ read }: { read: ReadProposal }) {
  const { contents, computation } = read
  const shown = contents.targets.flatMap((target) => {
    const computed = computation.targets.find(({ targetId }) => targetId === target.id)
    return computed && computed.visibleHours !== null
      ? [{ target, computed, total: computed.visibleHours }]
      : []
  })
  if (shown.length === 0) return null
  const { seasonFrom, seasonTo } = contents.call
  const months = seasonMonths(seasonFrom, seasonTo)
  const most = Math.max(1, ...shown.flatMap(({ computed }) => computed.visibleHoursByNight))
  const airmass = contents.constraintSets[0]?.maxAirmass ?? 1.8
  const used = contents.modes.filter(({ modeId }) =>
    contents.observations.some((one) => one.modeId === modeId),
  )
  const limits =
    used.map(({ telescope }) => limitWords(pointingOf(contents.site, telescope))).find(Boolean) ?? ''
  return (
    <section className="mt-12">
      <SectionHeading dense title="When your targets are up" />
      <div className="mt-3">
        <ChartFrame
          note={`Dark hours a night above airmass ${airmass}${limits}; a row is 0 to ${formatHours(most)}`}
          fileName={`hours-${contents.reference}`}
          numbers={{
            caption: 'Dark hours by month',
            columns: [
              { head: 'Target' },
              ...months.map(({ month }) => ({ head: monthName(month), unit: 'h', decimals: 1 })),
              { head: 'Season', unit: 'h', decimals: 1 },
            ],
            rows: shown.map(({ target, computed, total }) => [
              target.name,
              ...computed.visibleHoursByMonth.map(({ hours }) => hours),
              total,
            ]),
          }}
        >
          <UpBars
            label={`Dark hours a night of ${shown.length} targets from ${seasonFrom} to ${seasonTo}`}
            months={months.map(({ month, count }) => ({ name: monthName(month), count }))}
            maxHours={most}
            rows={shown.map(({ target, computed, total }) => ({
              name: target.name,
              byNight: computed.visibleHoursByNight,
              totalHours: total,
              tone: toneOf(read, target.id),
            }))}
          />
        </ChartFrame>
      </div>
    </section>
  )
}
