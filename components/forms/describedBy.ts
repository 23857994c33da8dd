interface Described {
  helpId: string
  errorId: string
  error: string | undefined
}

/** The ids that describe a control: its message first, then its help, then whatever else stands by it. */
export function describedBy(field: Described, hasHelp: boolean, extra?: string | false): string | undefined {
  const ids = [field.error && field.errorId, hasHelp && field.helpId, extra].filter(Boolean)
  return ids.length > 0 ? ids.join(' ') : undefined
}
