import type { RandomSource } from '../context'

/**
 * A number for the panel: the call and three digits, drawn at random among those still free, so that it
 * tells neither the reference nor the order of arrival. Null when a thousand are taken.
 */
export function drawReviewNumber(
  callNumber: number,
  taken: readonly string[],
  random: RandomSource,
): string | null {
  const used = new Set(taken)
  const free: string[] = []
  for (let digits = 0; digits < 1000; digits += 1) {
    const number = `${callNumber}-${String(digits).padStart(3, '0')}`
    if (!used.has(number)) free.push(number)
  }
  const [high = 0, low = 0, lowest = 0] = random.bytes(3)
  const draw = (high * 256 + low) * 256 + lowest
  return free[draw % free.length] ?? null
}
