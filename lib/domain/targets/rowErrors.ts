import { targetRowSchema, type TargetRow } from './schema'

/** Message by cell; empty when the row is right. */
export type RowErrors = Partial<Record<keyof TargetRow, string>>

/** Messages of a row, by cell. */
export function rowErrors(row: TargetRow): RowErrors {
  const result = targetRowSchema.safeParse(row)
  const errors: RowErrors = {}
  for (const issue of result.error?.issues ?? []) {
    const cell = issue.path[0] as keyof TargetRow | undefined
    if (cell) errors[cell] ??= issue.message
  }
  return errors
}
