import { formatList } from '@/lib/format'

/** Those who have yet to agree, as they stand in the read-through and beside the button that sends. */
export function leftOutWords(names: readonly string[]): string {
  const have = names.length === 1 ? 'has' : 'have'
  return `${formatList([...names])}, who ${have} yet to agree to be named`
}
