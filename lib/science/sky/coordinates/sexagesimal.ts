/** An angle read from text, degrees, or a sentence saying what is wrong with it. */
export type ParsedAngle =
  { readonly ok: true; readonly deg: number } | { readonly ok: false; readonly message: string }

/** Text of an angle taken apart. The sign stands by itself, so that -00 12 30 keeps it. */
export interface AngleText {
  readonly sign: 1 | -1 | null
  /** One number (decimal) or two or three (sexagesimal). */
  readonly parts: readonly string[]
  /** How the first part was marked: h for hours, d for degrees. */
  readonly unit: 'h' | 'd' | null
}

const LONGEST = 40
const number = String.raw`(\d+(?:\.\d*)?|\.\d+)`

/** Ways to write an angle, after its sign: 10 41 04.2, 10:41:04.2, 10h41m04.2s, 10d41m04s, 10°41′04″, 10.5, 10.5h, 10.5d. */
const shapes: readonly { pattern: RegExp; marked: boolean }[] = [
  { pattern: new RegExp(String.raw`^(\d+)\s*:\s*${number}(?:\s*:\s*${number})?$`), marked: false },
  { pattern: new RegExp(String.raw`^(\d+)\s+${number}(?:\s+${number})?$`), marked: false },
  {
    pattern: new RegExp(String.raw`^(\d+)\s*([hd])\s*${number}\s*m(?:\s*${number}\s*s)?$`),
    marked: true,
  },
  { pattern: new RegExp(String.raw`^${number}\s*([hd])?$`), marked: true },
]

/** One spelling for minus signs, degree, minute and second marks, and spaces. */
function plain(text: string): string {
  return text
    .trim()
    .toLowerCase()
    .replace(/[\u2212\u2013\u2010\u2011\uFE63\uFF0D]/g, '-')
    .replace(/[\u00A0\u2007\u2009\u202F\t]+/g, ' ')
    .replace(/[°º]|deg\b/g, 'd')
    .replace(/″|”|''|"|′′/g, 's')
    .replace(/[′’']/g, 'm')
}

/** Takes the text of an angle apart; null when it is none. */
export function readAngle(text: string): AngleText | null {
  if (text.length > LONGEST) return null
  const spelled = plain(text)
  const first = spelled[0]
  const sign = first === '-' ? -1 : first === '+' ? 1 : null
  const rest = sign === null ? spelled : spelled.slice(1).trimStart()
  for (const { pattern, marked } of shapes) {
    const match = pattern.exec(rest)
    if (!match) continue
    const groups = match.slice(1).filter((group) => group !== undefined)
    const unit = marked ? groups.find((group) => group === 'h' || group === 'd') : undefined
    return {
      sign,
      parts: groups.filter((group) => group !== 'h' && group !== 'd'),
      unit: unit === 'h' || unit === 'd' ? unit : null,
    }
  }
  return null
}

/** Adds the parts up in units of the first; a sentence when minutes or seconds reach 60 or a fraction is misplaced. */
export function sumParts(parts: readonly string[]): number | string {
  const [whole = 0, minutes = 0, seconds = 0] = parts.map(Number)
  if (minutes >= 60) return 'Minutes run from 0 to below 60.'
  if (seconds >= 60) return 'Seconds run from 0 to below 60.'
  if (parts.length === 3 && parts[1]?.includes('.')) return 'Only the last number may have decimals.'
  return whole + minutes / 60 + seconds / 3600
}
