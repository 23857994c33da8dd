import { LetterRefused } from './LetterRefused'

interface SmtpError {
  responseCode?: unknown
  command?: unknown
  response?: unknown
}

/**
 * A refusal for good, read from what the SMTP client threw; null for anything that may pass, and for refusals of
 * ourselves (signing in, or our own address), which say nothing about the letter or the person.
 */
export function refusalOf(error: unknown): LetterRefused | null {
  if (!(error instanceof Error)) return null
  const { responseCode, command, response } = error as SmtpError
  if (typeof responseCode !== 'number' || responseCode < 500 || responseCode > 599) return null
  const said = typeof response === 'string' ? response : error.message
  if (command === 'RCPT TO') return new LetterRefused('address', said, error)
  return command === 'DATA' ? new LetterRefused('letter', said, error) : null
}
