import { LineChart } from '@/components/charts/LineChart'
import { ChartFrame } from '@/components/charts/ChartFrame'
import { Facts } from '@/components/ui/Facts'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { ABSENT, formatDuration, formatHoursFromSeconds, formatNumber, formatPercent } from '@/lib/format'
import { cosmologySentence, snrCurve, type HoursHangOn } from '@/lib/domain/observations/rules'
import type { ExposureFacts, ObservationComputation } from '@/lib/domain/observations/types'
import type { Observation, Target } from '@/lib/domain/proposals/types'
import { HoursLedger } from './HoursLedger'
import { HoursRows } from './HoursRows'
import { snrWords } from './snrWords'

export interface ReportHoursProps {
  target: Target
  observation: Observation
  computed: ObservationComputation & { exposure: ExposureFacts; openShutterSeconds: number }
  hangOn: HoursHangOn
  /** What would have to move, or could be spared. */
  moves: readonly string[]
  cosmologyName: string
  /** The line's brightness counts, not the continuum's. */
  isForLine: boolean
  fileName: string
}

const lightOf = ({ brightness, line }: Target, isForLine: boolean) =>
  isForLine && line
    ? `the flux of ${line.name}`
    : brightness
      ? `${brightness.band} = ${formatNumber(brightness.value, 1)} (${brightness.system})`
      : 'the magnitude'

/** What the hours hang on: what limits them, signal-to-noise against time, and how they change with what is uncertain. */
export function ReportHours(props: ReportHoursProps) {
  const { target, observation, computed, hangOn, fileName } = props
  const { exposure, openShutterSeconds } = computed
  const until = Math.max(openShutterSeconds * 2, observation.askedSeconds)
  const points = snrCurve(exposure, openShutterSeconds, until)
  const unit = snrWords[observation.snrPer]
  return (
    <section>
      <SectionHeading title="What the hours hang on" />
      <div className="mt-3 grid gap-x-10 gap-y-3 border-y border-rule py-4 text-table md:grid-cols-2">
        <p className="m-0">{computed.regime}</p>
        <p className="m-0">
          {cosmologySentence(exposure.cosmologyMatters, lightOf(target, props.isForLine))}
        </p>
        {computed.carried ? (
          <p className={computed.carried.isAssumed ? 'm-0 text-marginal' : 'm-0'}>
            {computed.carried.sentence}
          </p>
        ) : null}
        {exposure.warnings.map((warning) => (
          <p key={warning} className="m-0 text-marginal">
            {warning}
          </p>
        ))}
      </div>
      <div className="mt-6 grid gap-x-16 gap-y-10 lg:grid-cols-2">
        <ChartFrame
          title={`Signal-to-noise ${unit}`}
          fileName={fileName}
          numbers={{
            caption: 'Signal-to-noise against open shutter',
            columns: [
              { head: 'Open shutter', unit: 'h', decimals: 3 },
              { head: 'Signal-to-noise', decimals: 1 },
            ],
            rows: points,
          }}
        >
          <LineChart
            fluid
            label={`Signal-to-noise ${unit} grows to ${formatNumber(points.at(-1)?.[1], 0)} in ${formatHoursFromSeconds(until)} of open shutter.`}
            series={[{ id: 'snr', name: props.cosmologyName, tone: 's1', points, chosen: true }]}
            xLabel="open shutter, h"
            guides={[
              { y: observation.wantedSnr, words: `wanted: ${formatNumber(observation.wantedSnr, 0)}` },
            ]}
            marks={[openShutterSeconds / 3600]}
            xDecimals={2}
          />
        </ChartFrame>
        <div className="flex flex-col gap-8">
          <HoursRows
            hangOn={hangOn}
            cosmologyName={props.cosmologyName}
            askedSeconds={observation.askedSeconds}
          />
          <Facts
            title="The exposure needed"
            facts={[
              { term: 'Open shutter', value: formatDuration(openShutterSeconds) },
              {
                term: 'Sub-exposures',
                value: computed.subExposures
                  ? `${computed.subExposures} of ${formatDuration(computed.subExposureSeconds ?? 0)}`
                  : ABSENT,
              },
              { term: 'Overheads', value: formatDuration(computed.overheadSeconds ?? 0) },
              { term: 'Delivered image', value: `${formatNumber(exposure.imageArcsec, 2)}″` },
              {
                term: 'Aperture of best signal-to-noise',
                value: `radius ${formatNumber(exposure.apertureRadiusArcsec, 2)}″, ${formatPercent(exposure.enclosedFraction, 0)} of the light`,
              },
              {
                term: `Sky, ${exposure.skyBand}`,
                value: `${formatNumber(exposure.skyAbArcsec2, 1)} mag/arcsec² AB`,
              },
              { term: 'Brightest pixel', value: `${formatPercent(exposure.peakFraction, 0)} of full well` },
              {
                term: 'Needed, overheads included',
                value: formatHoursFromSeconds(computed.neededSeconds ?? 0),
                total: true,
              },
            ]}
          />
        </div>
      </div>
      <HoursLedger
        hangOn={hangOn}
        computed={computed}
        askedSeconds={observation.askedSeconds}
        moves={props.moves}
      />
    </section>
  )
}
