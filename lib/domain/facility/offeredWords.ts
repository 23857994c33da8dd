import { countInWords } from '@/lib/format'

/** What a call offers of something in the facility: the one mode by name, more of them counted. */
export function offeredWords(modes: readonly string[]): string {
  const [first = ''] = modes
  return modes.length === 1 ? first : `${countInWords(modes.length, 'mode')} of it`
}
