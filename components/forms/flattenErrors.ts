import type { FieldErrors } from 'react-hook-form'

export interface FieldMessage {
  name: string
  message: string
}

/** The messages of a form, nested names joined by dots as the fields carry them: `targets.0.redshift`. */
export function flattenErrors(errors: FieldErrors, prefix = ''): FieldMessage[] {
  return Object.entries(errors).flatMap(([key, error]) => {
    if (!error || typeof error !== 'object') return []
    const name = prefix ? `${prefix}.${key}` : key
    if (typeof error.message === 'string' && 'type' in error) return [{ name, message: error.message }]
    return flattenErrors(error as FieldErrors, name)
  })
}
