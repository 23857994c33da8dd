/** `Aldous, EMBER`; several instruments of one telescope stand after it once. */
export function instrumentWords(modes: readonly { instrument: string; telescope: string }[]): string {
  const byTelescope = new Map<string, Set<string>>()
  for (const { telescope, instrument } of modes)
    byTelescope.set(telescope, (byTelescope.get(telescope) ?? new Set()).add(instrument))
  return [...byTelescope].map(([telescope, instruments]) => [telescope, ...instruments].join(', ')).join('; ')
}
