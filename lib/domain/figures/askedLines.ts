import type { AskedLine } from '@/lib/panel/nights/types'
import type { Snapshot } from '../submission/snapshot'

type Contents = Pick<Snapshot['contents'], 'observations' | 'modes'>

/** What a proposal asks of each instrument, as it asked it. */
export function askedLines(proposal: number, { observations, modes }: Contents): AskedLine[] {
  const lines = new Map<number, AskedLine>()
  for (const { modeId, askedSeconds } of observations) {
    const mode = modes.find((one) => one.modeId === modeId)
    if (!mode) continue
    const { id: instrument } = mode.instrument
    const line = lines.get(instrument)
    lines.set(instrument, {
      proposal,
      instrument,
      telescope: mode.telescope.id,
      seconds: (line?.seconds ?? 0) + askedSeconds,
      least: 0,
      possible: true,
    })
  }
  return [...lines.values()].filter(({ seconds }) => seconds > 0)
}
