export const themeCookie = 'noctuary-theme'

export const themes = [
  { id: 'day', name: 'Day' },
  { id: 'dome', name: 'Dome' },
  { id: 'red', name: 'Red lamp' },
] as const

export type ThemeId = (typeof themes)[number]['id']

/** The theme a cookie names; anything else is day. */
export function themeFrom(value: string | undefined): ThemeId {
  return themes.find((theme) => theme.id === value)?.id ?? 'day'
}
