/** What pages compute with in the browser: the pure part of this noun, the same code the verbs use. */
export { askFor } from './askFor'
export { computeProposal } from './computeProposal'
export { comparisonOf, cosmologyOf } from './cosmologyOf'
export { constraintRow } from './constraintSchema'
export { defaultConstraints } from './defaultConstraints'
export { hoursText, newObservationRow, observationRow } from './observationRow'
export { takeOver } from './rememberedObservation'
export { isForLine } from './isForLine'
export { cosmologySentence } from './regimeSentence'

export { conditionsOf } from './seasonOf'

export { worstVerdict } from './worstVerdict'
export { hoursHangOn, type HoursHangOn, type HoursSpan } from './hoursUnder'
export type { ReportContents } from './reportContents'
export { seasonView, type SeasonView } from './seasonView'
export { snrCurve } from './snrCurve'
export { whatWouldMove } from './whatWouldMove'
