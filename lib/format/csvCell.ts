const plainNumber = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i

/**
 * One cell of a CSV file. Spreadsheets run text that begins with = + - or @ as a formula: such text gets an
 * apostrophe in front, plain numbers stay numbers. Quotes are doubled; a comma, quote or line end is quoted.
 */
export function csvCell(value: string | number | boolean | null | undefined): string {
  if (value === null || value === undefined) return ''
  const text = String(value)
  const risky = /^[\s]*[=+\-@\t\r]/.test(text) && !plainNumber.test(text)
  const safe = risky ? `'${text}` : text
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}
