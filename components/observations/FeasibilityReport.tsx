import { BarNote } from '@/components/ui/BarNote'
import { EmptyState } from '@/components/ui/EmptyState'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { VerdictMark } from '@/components/ui/VerdictMark'
import { countInWords, formatHoursFromSeconds, formatNumber } from '@/lib/format'
import {
  awaitedWords,
  conditionsOf,
  cosmologyOf,
  hoursHangOn,
  isForLine,
  seasonView,
  whatWouldMove,
  type ReportContents,
} from '@/lib/domain/observations/rules'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import { GroupsStanding } from './GroupsStanding'
import { ObservationTabs } from './ObservationTabs'
import { ReportChecks } from './ReportChecks'
import { ReportHours } from './ReportHours'
import { ReportSeason } from './ReportSeason'
import { ReportSpectrum } from './ReportSpectrum'
import { snrWords } from './snrWords'
import { targetWords } from './targetWords'
import { StandsAbove, type AssessmentAbove } from './StandsAbove'

export interface FeasibilityReportProps {
  contents: ReportContents
  computation: ProposalComputation
  /** The observation shown; the first one when it is not among them. */
  chosen: number | null
  /** Where the report of an observation is. */
  hrefOf: (observationId: number) => string
  /** What the instrument scientists said, where the reader may know it: it stands above the computed verdict. */
  assessments?: readonly AssessmentAbove[]
  /** Beside the title of the checks: other cosmologies, a note. */
  aside?: React.ReactNode
}

/** How the hours of an observation count where it is not once. */
function countsWords(times: number): string {
  if (times === 0) return ', not counted in the hours of the whole'
  return times === 1 ? '' : ` for each of ${countInWords(times, 'trigger')}`
}

/** Can it be done: one observation at a time, with its season, its checks, its lines and its hours. Names nobody. */
export function FeasibilityReport({
  contents,
  computation,
  chosen,
  hrefOf,
  assessments = [],
  aside,
}: FeasibilityReportProps) {
  const targets = new Map(contents.targets.map((target) => [target.id, target]))
  const observation = contents.observations.find(({ id }) => id === chosen) ?? contents.observations[0]
  const target = observation ? targets.get(observation.targetId) : undefined
  const computed = computation.observations.find(({ observationId }) => observationId === observation?.id)
  if (!observation || !target || !computed)
    return (
      <EmptyState title="Nothing to check yet">Say what is to be observed; its checks stand here.</EmptyState>
    )

  const mode = contents.modes.find(({ modeId }) => modeId === observation.modeId)
  const { maxAirmass } = conditionsOf(contents, observation)
  const { seasonFrom, seasonTo } = contents.call
  const season = {
    from: seasonFrom,
    to: seasonTo,
    maxAirmass,
    twilightLimitDeg: mode?.twilightLimitDeg ?? -18,
    telescope: mode?.telescope,
  }
  const view = seasonView(contents.site, season, target)
  const clear = computed.checks.filter(({ verdict }) => verdict === 'feasible').length
  const firstOpen = computed.checks.find(
    ({ verdict }) => verdict === computed.verdict && verdict !== 'feasible',
  )
  const awaited = awaitedWords(target)
  const fileName = target.name.replace(/[^\w+-]+/g, '-').toLowerCase()
  const tabName = (one: typeof observation) => {
    const own = contents.observations.filter(({ targetId }) => targetId === one.targetId)
    const name = targets.get(one.targetId)?.name ?? ''
    const modeName = contents.modes.find(({ modeId }) => modeId === one.modeId)?.instrument.name ?? ''
    return own.length > 1 ? `${name}, ${modeName}` : name
  }

  const assessed = assessments.find(({ instrument }) => instrument === mode?.instrument.name)
  const cosmology = cosmologyOf(contents.cosmology.parameters)
  const input = { contents, target, observation, mode, cosmology }

  return (
    <div className="flex flex-col gap-10">
      <GroupsStanding computation={computation} />
      <ObservationTabs
        chosen={observation.id}
        tabs={contents.observations.map((one) => ({
          id: one.id,
          name: tabName(one),
          verdict:
            computation.observations.find(({ observationId }) => observationId === one.id)?.verdict ??
            'not-feasible',
          href: hrefOf(one.id),
        }))}
      />
      <div className="flex flex-wrap items-start justify-between gap-x-16 gap-y-4">
        <div>
          <h2 className="text-display max-sm:text-figure">{target.name}</h2>
          <p className="mt-1 text-muted">
            {targetWords(target, isForLine(input))}.
            <br />
            {mode?.name ?? 'A mode that is gone'}, S/N {formatNumber(observation.wantedSnr, 0)}{' '}
            {snrWords[observation.snrPer]}
            {observation.feature ? ` in ${observation.feature}` : ''},{' '}
            {formatHoursFromSeconds(observation.askedSeconds)} asked{countsWords(computed.times)}.
          </p>
          {awaited ? <p className="mt-1 max-w-prose text-table">{awaited}</p> : null}
        </div>
        <div className="max-w-prose">
          {assessed ? <StandsAbove assessment={assessed} /> : null}
          <BarNote tone={computed.verdict}>
            <VerdictMark
              verdict={computed.verdict}
              strong
              words={`Computed: ${computed.verdict.replace('-', ' ')}, ${clear} of ${computed.checks.length} checks clear.`}
            />
            {firstOpen ? <p className="mt-1">{firstOpen.why}</p> : null}
            {awaited && target.raDeg === null ? (
              <p className="mt-1">When it is up is not among them: it has no position yet.</p>
            ) : null}
          </BarNote>
        </div>
      </div>
      {view ? (
        <ReportSeason
          title="When it is up"
          name={target.name}
          site={contents.site}
          view={view}
          maxAirmass={maxAirmass}
          telescope={mode?.telescope}
          fileName={`season-${fileName}`}
        />
      ) : null}
      <section>
        <SectionHeading
          title={`The ${countInWords(computed.checks.length, 'check')}`}
          aside={
            aside ?? (
              <span>
                Under {computation.cosmologyName}, engine {computation.engineVersion}. Marginal lies between
                the two limits.
              </span>
            )
          }
        />
        <div className="mt-3">
          <ReportChecks name={target.name} checks={computed.checks} fileName={`checks-${fileName}`} />
        </div>
      </section>
      {mode?.kind === 'long-slit' && target.redshift !== null ? (
        <ReportSpectrum
          mode={mode}
          redshift={target.redshift}
          observation={observation}
          verdict={computed.checks.find(({ id }) => id === 'clear-of-bands')?.verdict ?? computed.verdict}
        />
      ) : null}
      {computed.exposure && computed.openShutterSeconds !== null ? (
        <ReportHours
          target={target}
          observation={observation}
          computed={{
            ...computed,
            exposure: computed.exposure,
            openShutterSeconds: computed.openShutterSeconds,
          }}
          hangOn={hoursHangOn(input)}
          moves={whatWouldMove(input, computed)}
          isForLine={isForLine(input)}
          cosmologyName={computation.cosmologyName}
          fileName={`signal-${fileName}`}
        />
      ) : null}
    </div>
  )
}
