/**
 * The mail server refused a letter for good (an SMTP reply of the 5xx family): trying again would change nothing.
 * `address`: there is no such mailbox. `letter`: it was this letter that was not wanted.
 */
export class LetterRefused extends Error {
  override readonly name = 'LetterRefused'
  readonly because: 'address' | 'letter'

  constructor(because: 'address' | 'letter', said: string, cause: unknown) {
    super(said, { cause })
    this.because = because
  }
}
