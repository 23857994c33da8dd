import type { z } from 'zod'

/** The first message of each field, keyed as react-hook-form names it ('targets.3.redshift'). */
export function fieldErrorsOf(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {}
  for (const issue of error.issues) {
    const name = issue.path.join('.') || 'form'
    fields[name] ??= issue.message
  }
  return fields
}
