import type { Unit } from './readUnit'

/** Whether two units measure the same thing. */
export function sameDimensions(a: Unit, b: Unit): boolean {
  const bases = new Set([...Object.keys(a.powers), ...Object.keys(b.powers)])
  return [...bases].every((base) => (a.powers[base] ?? 0) === (b.powers[base] ?? 0))
}
