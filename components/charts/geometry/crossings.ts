/**
 * Hours at which a sampled altitude crosses a level, going down and coming up again, by linear interpolation
 * (on a half-hour grid within a minute for the Sun). Null where it never does.
 */
export function crossings(
  hours: readonly number[],
  altitudesDeg: readonly number[],
  levelDeg: number,
): { down: number | null; up: number | null } {
  let down: number | null = null
  let up: number | null = null
  for (let index = 1; index < hours.length; index++) {
    const [h0, h1] = [hours[index - 1] as number, hours[index] as number]
    const [a0, a1] = [altitudesDeg[index - 1] as number, altitudesDeg[index] as number]
    if (a0 >= levelDeg === a1 >= levelDeg) continue
    const hour = h0 + ((h1 - h0) * (a0 - levelDeg)) / (a0 - a1)
    if (a0 > a1) down ??= hour
    else up = hour
  }
  return { down, up }
}
