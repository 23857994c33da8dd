const MINUS = '\u2212'

/** Splits an amount of the first unit into three parts after rounding, so that 59.99 never prints as 60. */
function split(value: number, decimals: number): [number, number, string] {
  const scale = 10 ** decimals
  const units = Math.round(value * 3600 * scale)
  const whole = Math.floor(units / (3600 * scale))
  const rest = units - whole * 3600 * scale
  const minutes = Math.floor(rest / (60 * scale))
  const seconds = ((rest - minutes * 60 * scale) / scale).toFixed(decimals)
  return [whole, minutes, seconds.padStart(decimals > 0 ? 3 + decimals : 2, '0')]
}

function two(value: number): string {
  return String(value).padStart(2, '0')
}

/** A right ascension, degrees, as 12 29 06.70: hours, minutes and seconds with `decimals` decimals. */
export function formatRightAscension(deg: number, decimals = 2): string {
  const turn = ((deg % 360) + 360) % 360
  const [hours, minutes, seconds] = split(turn / 15, decimals)
  return `${two(hours % 24)} ${two(minutes)} ${seconds}`
}

/** A declination, degrees, as +02 03 08.6 or −00 12 30.0, with a true minus. */
export function formatDeclination(deg: number, decimals = 1): string {
  const [degrees, minutes, seconds] = split(Math.abs(deg), decimals)
  const sign = deg < 0 || Object.is(deg, -0) ? MINUS : '+'
  return `${sign}${two(degrees)} ${two(minutes)} ${seconds}`
}
