/** Can it be done: the checks of a request and the verdict of a proposal. */
export { lineStrip, linesOnStrip, type StripAsked, type StripLine } from './lineStrip'
export { observationReport } from './observationReport'
export {
  proposalVerdict,
  type GroupVerdict,
  type ProposalVerdict,
  type VerdictGroup,
} from './proposalVerdict'
export type {
  Check,
  ObservationReport,
  ReportInput,
  ReportObservation,
  ReportTarget,
  Season,
  Verdict,
} from './types'
export { neverUp, type NeverUpInput } from './neverUp'
export { feasibilityEngineVersion } from './version'
export { limitWords } from './limitWords'
export { sayCarried, sayPlace } from './sayCarried'
export { moonClassLimits } from './moonClass'
