import { cleanText } from '../proposals/cleanText'

/** The last part of a file's name, one line, short enough to keep. It is shown, never used as a path. */
export const shownName = (name: string, otherwise: string): string =>
  (cleanText(name).split(/[\\/]/).at(-1) ?? '').replace(/\s+/g, ' ').trim().slice(-200) || otherwise
