/** Sun altitudes at which the sky's colour is given (`--sky-0` … `--sky-7`); linear between. */
export const skyKnotsDeg = [0, -1, -4, -7, -10, -14, -18, -60] as const

/** Rounded to a tenth of a percent: the page stays small and the eye sees no difference. */
const percent = (share: number) => `${Math.round(share * 1000) / 10}%`

/**
 * The sky's colour for a Sun altitude, as CSS that follows the theme by itself.
 * Above the horizon it is day; below the last knot the night is as dark as it gets.
 */
export function skyColour(sunAltitudeDeg: number): string {
  if (sunAltitudeDeg >= 0) return 'var(--sky-0)'
  for (let index = 1; index < skyKnotsDeg.length; index++) {
    const upper = skyKnotsDeg[index - 1] as number
    const lower = skyKnotsDeg[index] as number
    if (sunAltitudeDeg < lower) continue
    const share = (upper - sunAltitudeDeg) / (upper - lower)
    if (share >= 1) return `var(--sky-${index})`
    return `color-mix(in srgb, var(--sky-${index}) ${percent(share)}, var(--sky-${index - 1}))`
  }
  return 'var(--sky-7)'
}
