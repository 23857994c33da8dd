import { inlinesIn } from './inlinesIn'
import type { Written } from './tree'

/** Labels of the figures a text points to, in the order they are first named. */
export function figuresNamed(written: Written): string[] {
  return [...new Set(inlinesIn(written).flatMap((one) => (one.kind === 'figure' ? [one.label] : [])))]
}
