import { readValues } from './inverseFields'
import { nearFields, type NearFields } from './nearFields'
import { parseRedshifts } from './parseRedshifts'
import { compareSheet } from './sheets/compareSheet'
import { distancesSheet } from './sheets/distancesSheet'
import { inverseSheet } from './sheets/inverseSheet'
import { nearSheet, type Surroundings } from './sheets/nearSheet'
import { shellsOf, surveySheet } from './sheets/surveySheet'
import { surveyFields, type SurveyFields } from './surveyFields'
import type { Sheet } from './sheets/sheet'
import type { YardstickState } from './state'
import type { MeasuredUniverse, ReadyUniverse, Universes } from './universes'

/** All that follows from what was typed. */
export interface YardstickView {
  /** The state it was made from. */
  state: YardstickState
  universes: MeasuredUniverse[]
  ready: ReadyUniverse[]
  /** What the others are set against: the one chosen, or the first that can be computed with. */
  reference: ReadyUniverse | null
  /** Marked on the axis of plots: those typed, or those found. */
  redshifts: number[]
  /** Sentences at the list of redshifts or values. */
  troubles: string[]
  /** Values of the list that were read. */
  count: number
  near: NearFields | null
  /** Position, frame and motion near by, once they can be read. */
  around: Surroundings | null
  survey: SurveyFields | null
  /** Null while no universe can be computed with, or a position cannot be read. */
  sheet: Sheet | null
}

function nearOf(state: YardstickState, redshifts: readonly number[], ready: readonly ReadyUniverse[]) {
  const near = nearFields(state)
  const { raDeg, decDeg, motionKmS } = near
  if (ready.length === 0 || raDeg === null || decDeg === null || motionKmS === null)
    return { near, around: null, sheet: null }
  const around: Surroundings = { frame: state.frame, raDeg, decDeg, peculiarKmS: motionKmS }
  return { near, around, sheet: nearSheet(redshifts, ready, around) }
}

function surveyOf(
  state: YardstickState,
  { redshifts, ready, troubles }: Pick<YardstickView, 'redshifts' | 'ready' | 'troubles'>,
) {
  const survey = surveyFields(state)
  const shells = shellsOf(redshifts)
  const few = troubles.length === 0 && shells.length === 0
  return {
    survey,
    troubles: few ? ['Give two redshifts at least: the edges of a shell.'] : troubles,
    sheet: ready.length > 0 && survey.survey ? surveySheet(shells, ready, survey.survey) : null,
  }
}

/** Redshifts of an inverse sheet: every number under a cosmology. */
const foundIn = ({ columns, rows }: Sheet): number[] => [
  ...new Set(
    rows.flatMap(({ cells }) =>
      cells.flatMap(({ value }, at) =>
        columns[at]?.place !== null && typeof value === 'number' ? [value] : [],
      ),
    ),
  ),
]

/** Computes the page from its state: the same on the server, which renders it first, and in the browser. */
export function viewOf(state: YardstickState, { universes, ready }: Universes): YardstickView {
  const reference = ready.find(({ place }) => place === state.reference) ?? ready[0] ?? null
  const common = { state, universes, ready, reference, near: null, around: null, survey: null }
  if (state.mode === 'inverse') {
    const { values, troubles } = readValues(state.values, state.from)
    const sheet = inverseSheet(values, ready, state.from)
    return { ...common, redshifts: foundIn(sheet), troubles, count: values.length, sheet: reference && sheet }
  }
  const { redshifts, troubles } = parseRedshifts(state.z)
  const read = { ...common, redshifts, troubles, count: redshifts.length }
  if (state.mode === 'near') return { ...read, ...nearOf(state, redshifts, ready) }
  if (state.mode === 'survey') return { ...read, ...surveyOf(state, read) }
  const sheet =
    state.mode === 'compare'
      ? reference && compareSheet(redshifts, ready, reference, state.columns)
      : reference && distancesSheet(redshifts, ready, state.columns)
  return { ...read, sheet }
}
