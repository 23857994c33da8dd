/** Why a calculation was refused. The message is a sentence a principal investigator understands. */
export type ScienceErrorCode =
  | 'bad-parameter'
  | 'bad-redshift'
  | 'past-the-turn'
  | 'past-the-antipode'
  | 'no-beginning'
  | 'bad-coordinate'
  | 'bad-date'
  | 'bad-site'
  | 'bad-source'
  | 'bad-mode'
  | 'outside-range'
  | 'unreachable'
  | 'unknown-name'

/** Input outside the valid range of a formula: never answered with NaN. */
export class ScienceError extends Error {
  readonly code: ScienceErrorCode

  constructor(code: ScienceErrorCode, message: string) {
    super(message)
    this.name = 'ScienceError'
    this.code = code
  }
}
