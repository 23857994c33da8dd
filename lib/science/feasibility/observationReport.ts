import { seasonVisibility } from './seasonVisibility'
import { checkClearOfBands, checkClearOfSkyLines, checkInRange } from './featureChecks'
import { checkHoursAsked, checkNotOverAsked, checkUp, checkUpWithMoon } from './hoursChecks'
import { worst } from './judge'
import { checkLikelyInRange } from './likelyInRange'
import { checkImage, checkSaturation, checkSignal } from './lightChecks'
import { planExposure } from './plan'
import { checkDistance, checkRedshiftExists } from './redshiftChecks'
import { asksForLine } from './sourceOf'
import type { Check, ObservationReport, ReportInput } from './types'
import { feasibilityEngineVersion } from './version'

/**
 * Every check of one target with one mode, each with its own margins, and the verdict: the worst of them.
 * A planning estimate; deterministic: the same input and engine give the same bytes as JSON. A check that
 * has nothing to go by (no redshift, position, brightness or feature) is left out.
 */
export function observationReport(input: ReportInput): ObservationReport {
  const { cosmology, target, mode, observation, site } = input
  const checks: Check[] = []
  const z = target.redshift

  if (z !== null) {
    const exists = checkRedshiftExists(cosmology, z)
    checks.push(exists)
    if (exists.verdict === 'feasible') checks.push(checkDistance(cosmology, target, z))
  }

  const { feature } = observation
  const observedA = feature && z !== null ? feature.restA * (1 + z) : null
  if (feature && observedA !== null) {
    const seen = { ...feature, observedA }
    const inRange = checkInRange(mode, seen)
    checks.push(inRange)
    const { redshiftError: error, redshiftType: type } = target
    if (z !== null && error && type && type !== 'spectroscopic')
      checks.push(checkLikelyInRange(mode, feature, { z, error, type }))
    if (inRange.verdict !== 'not-feasible') {
      checks.push(checkClearOfBands(mode, seen))
      if (mode.kind === 'long-slit') checks.push(checkClearOfSkyLines(mode, seen))
    }
  }

  const season = seasonVisibility(input)
  if (season) {
    checks.push(checkUp(season, input))
    // The Moon does not matter to what is never up.
    if (season.visible.totalHours > 0) checks.push(checkUpWithMoon(season.usableHours, observation))
  }

  const plan = planExposure(input, observedA)
  if (target.brightness || asksForLine(input)) {
    checks.push(checkSignal(plan.reached, observation.snr, plan.refusal))
  }
  if (plan.needed) {
    checks.push(checkHoursAsked(observation.askedS, plan.needed.totalS, plan.needed.openS))
    checks.push(checkNotOverAsked(observation.askedS, plan.needed.totalS))
    checks.push(checkSaturation(plan.needed))
    checks.push(checkImage(site, observation, plan.needed.imageArcsec))
  }

  return {
    engineVersion: feasibilityEngineVersion,
    checks,
    clear: checks.filter((check) => check.verdict === 'feasible').length,
    verdict: worst(checks.map((check) => check.verdict)),
    exposure: plan.needed,
    refusal: plan.refusal,
    carried: plan.carried?.sentence
      ? { sentence: plan.carried.sentence, isAssumed: plan.carried.isAssumed }
      : null,
    totalAtMedianS: plan.totalAtMedianS,
    totalAtBestS: plan.totalAtBestS,
    observedFeatureA: observedA,
    visibility: season?.visible ?? null,
    usableHours: season?.usableHours ?? null,
  }
}
