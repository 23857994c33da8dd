import type { Cosmology } from '@/lib/science/cosmology'
import { observationReport, type ObservationReport } from '@/lib/science/feasibility'
import { pointingOf } from '../facility/pointingOf'
import type { ModeRecord } from '../facility/types'
import type { Observation, Target } from '../proposals/types'
import { regimeSentence } from './regimeSentence'
import type { ReportContents } from './reportContents'
import { gapChecks, modeGone, outsideSeason } from './requestChecks'
import { isForLine } from './isForLine'
import { moonClass, scienceGeometry, scienceMode, scienceSite, transparencyShare } from './scienceRecords'
import { conditionsOf } from './seasonOf'
import { skyTargetOf } from './skyTargetOf'
import type { ExposureFacts, FeasibilityCheck, ObservationComputation } from './types'
import { worstVerdict } from './worstVerdict'

export interface ObservationInput {
  contents: ReportContents
  target: Target
  observation: Observation
  mode: ModeRecord | undefined
  cosmology: Cosmology
}

const nothing = {
  neededSeconds: null,
  openShutterSeconds: null,
  overheadSeconds: null,
  subExposures: null,
  subExposureSeconds: null,
  snrReached: null,
  regime: null,
  observedFeatureA: null,
  usableHours: null,
  exposure: null,
  carried: null,
  times: 1,
}

function withoutExposure(input: ObservationInput, checks: FeasibilityCheck[]): ObservationComputation {
  return {
    ...nothing,
    observationId: input.observation.id,
    targetId: input.target.id,
    checks,
    verdict: worstVerdict(checks.map(({ verdict }) => verdict)) ?? 'not-feasible',
    refusal: checks.at(-1)?.why ?? null,
  }
}

/** The request as the engine takes it. */
export function reportOf(
  input: ObservationInput & { mode: ModeRecord },
  from: string,
  to: string,
  { searchNights = true } = {},
): ObservationReport {
  const { contents, target, observation, cosmology } = input
  const conditions = conditionsOf(contents, observation)
  const sky = skyTargetOf(target)
  const { feature, featureRestA } = observation
  return observationReport({
    cosmology,
    site: scienceSite(contents.site),
    pointing: pointingOf(contents.site, input.mode.telescope),
    target: {
      id: target.id,
      name: target.name,
      raDeg: searchNights ? (sky?.raDeg ?? null) : null,
      decDeg: sky?.decDeg ?? null,
      pmRaMasYr: sky?.pmRaMasYr,
      pmDecMasYr: sky?.pmDecMasYr,
      redshift: target.redshift,
      redshiftError: target.redshiftError,
      redshiftType: target.redshiftType,
      geometry: scienceGeometry(target),
      brightness: target.brightness,
      // A version that was frozen before these were asked for holds none of them.
      line: target.line ?? null,
      spectrum: target.spectrum ?? null,
      galacticEbv: target.galacticEbv ?? null,
      magnification: target.magnification ?? null,
    },
    mode: scienceMode(input.mode),
    observation: {
      id: observation.id,
      snr: observation.wantedSnr,
      snrPer: observation.snrPer,
      feature: feature !== null && featureRestA !== null ? { name: feature, restA: featureRestA } : null,
      askedS: observation.askedSeconds,
      maxAirmass: conditions.maxAirmass,
      seeingArcsec: conditions.imageQualityArcsec,
      moon: moonClass(conditions.moon),
      minMoonSeparationDeg: conditions.minMoonSeparationDeg,
      transparency: transparencyShare[conditions.transparency],
    },
    season: { from, to },
  })
}

function factsOf(exposure: NonNullable<ObservationReport['exposure']>): ExposureFacts {
  return {
    imageArcsec: exposure.imageArcsec,
    apertureRadiusArcsec: exposure.apertureRadiusArcsec,
    enclosedFraction: exposure.enclosedFraction,
    pixels: exposure.pixels,
    skyAbArcsec2: exposure.skyAbArcsec2,
    skyBand: exposure.skyBand,
    peakFraction: exposure.peakFraction,
    wavelengthA: exposure.wavelengthA,
    regime: exposure.regime,
    regimeShare: exposure.regimeShare,
    timeExponentOfFlux: exposure.timeExponentOfFlux,
    timeExponentOfDistance: exposure.timeExponentOfDistance,
    cosmologyMatters: exposure.cosmologyMatters,
    signalE: exposure.signalE,
    variance: { ...exposure.variance },
    warnings: [...exposure.warnings],
  }
}

/** Exposure and checks of one observation. What cannot be computed is a check that is not clear, with its reason. */
export function computeObservation(input: ObservationInput): ObservationComputation {
  const { contents, target, observation, mode } = input
  if (!mode) return withoutExposure(input, [modeGone()])
  const { call } = contents
  const { dateFrom, dateTo } = conditionsOf(contents, observation)
  const from = dateFrom && dateFrom > call.seasonFrom ? dateFrom : call.seasonFrom
  const to = dateTo && dateTo < call.seasonTo ? dateTo : call.seasonTo
  if (from > to) return withoutExposure(input, [outsideSeason(call.seasonFrom, call.seasonTo)])

  const report = reportOf({ ...input, mode }, from, to)
  const checks = [...gapChecks(target, isForLine({ target, observation, mode })), ...report.checks]
  const { exposure } = report
  const signal = report.checks.find(({ id }) => id === 'signal-to-noise')
  const reached = signal ? Number(signal.measured.replaceAll(',', '')) : NaN
  return {
    observationId: observation.id,
    targetId: target.id,
    neededSeconds: exposure ? Math.ceil(exposure.totalS) : null,
    openShutterSeconds: exposure ? exposure.openS : null,
    overheadSeconds: exposure ? exposure.overheadS : null,
    subExposures: exposure ? exposure.subExposures : null,
    subExposureSeconds: exposure ? exposure.subExposureS : null,
    snrReached: Number.isFinite(reached) ? reached : null,
    regime: exposure ? regimeSentence(exposure) : null,
    observedFeatureA: report.observedFeatureA,
    usableHours: report.usableHours,
    exposure: exposure ? factsOf(exposure) : null,
    carried: report.carried,
    checks,
    verdict: worstVerdict(checks.map(({ verdict }) => verdict)) ?? 'feasible',
    refusal: report.refusal,
    times: 1,
  }
}
