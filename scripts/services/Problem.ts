/** A failure of the scripts that we can explain: what went wrong, and what to do about it. */
export class Problem extends Error {
  constructor(
    message: string,
    readonly remedy: string,
    readonly details: readonly string[] = [],
  ) {
    super(message)
    this.name = 'Problem'
  }
}
