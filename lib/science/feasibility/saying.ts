const MINUS = '\u2212'
const GAP = '\u00a0'

/** A number with a fixed count of decimals, thousands commas and a true minus. */
export function sayNumber(value: number, decimals: number): string {
  const [whole = '0', fraction] = Math.abs(value).toFixed(decimals).split('.')
  const grouped = whole.replace(/\B(?=(\d{3})+$)/g, ',')
  const digits = fraction === undefined ? grouped : `${grouped}.${fraction}`
  return value < 0 && Number(digits.replaceAll(',', '')) !== 0 ? MINUS + digits : digits
}

export function sayHours(seconds: number): string {
  return `${sayNumber(seconds / 3600, 1)}${GAP}h`
}

export function sayPercent(share: number, decimals = 0): string {
  return `${sayNumber(share * 100, decimals)}${GAP}%`
}

export function sayAngstrom(wavelengthA: number): string {
  return `${sayNumber(wavelengthA, 0)}${GAP}Å`
}
