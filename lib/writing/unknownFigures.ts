import { inlinesIn } from './inlinesIn'
import type { Written } from './tree'

/** Labels a text points to that no figure has, each with the line it stands on first. */
export function unknownFigures(
  written: Written,
  labels: readonly string[],
): { label: string; line: number }[] {
  const first = new Map<string, number>()
  for (const one of inlinesIn(written))
    if (one.kind === 'figure' && !labels.includes(one.label) && !first.has(one.label))
      first.set(one.label, one.line)
  return [...first].map(([label, line]) => ({ label, line }))
}
