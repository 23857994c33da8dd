import { themeCookie, type ThemeId } from './themes'

const oneYearInSeconds = 31_536_000

/** Changes the light at once and remembers it, so that the server renders the next page in it. */
export function applyTheme(theme: ThemeId): void {
  document.documentElement.dataset.theme = theme
  document.cookie = `${themeCookie}=${theme}; path=/; max-age=${oneYearInSeconds}; samesite=lax`
}
