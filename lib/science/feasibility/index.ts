/** Can it be done: the checks of a request and the verdict of a proposal. */
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
export { feasibilityEngineVersion } from './version'
export { limitWords } from './limitWords'
export { moonClassLimits } from './moonClass'
