const sexagesimal = /^[+-]\d[\d\s:.]*$/

/**
 * A cell between commas that neither a spreadsheet runs as a formula nor a reader takes for a comment: text that begins
 * with = + - or @ gets an apostrophe in front, which reading takes off again, and so does one that has apostrophes
 * there already; # and blanks are quoted. Numbers stay as they are, and sexagesimal angles where `keepsAngles`, in a
 * format that other programs read by its own rules.
 */
export function guardedCell(text: string, keepsAngles: boolean): string {
  const isPlain = (text !== '' && Number.isFinite(Number(text))) || (keepsAngles && sexagesimal.test(text))
  const safe = /^\s*'*[=+\-@\t\r]/.test(text) && !isPlain ? `'${text}` : text
  return /[",\r\n#]|^\s|\s$/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe
}
