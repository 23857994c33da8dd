import type { FormFailure, RefusedResult } from './actionFormTypes'

/** The connection failed before an answer came: what was typed is still there. */
export const networkFailure: FormFailure = {
  heading: 'The observatory did not answer',
  message: 'Nothing you typed is lost. Check the connection, then send it again.',
}

/** Words for a refusal that no field is to blame for. */
export function failureOf(result: RefusedResult): FormFailure {
  if (result.kind === 'unexpected') {
    return {
      heading: 'Something went wrong on our side',
      message: result.message,
      reference: result.reference,
    }
  }
  if (result.kind === 'not-signed-in')
    return {
      heading: 'You have been signed out',
      message: 'Nothing you typed is lost. Sign in on another page, come back to this one and send it again.',
      signIn: true,
    }
  return { heading: 'That could not be done', message: result.message, reference: result.reference }
}
