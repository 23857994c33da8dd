import type { ProposalContents } from '../proposals/types'

/** Instruments a proposal asks for, each once. */
export function instrumentsUsed(contents: Pick<ProposalContents, 'observations' | 'modes'>): number[] {
  const used = new Set(contents.observations.map(({ modeId }) => modeId))
  return [
    ...new Set(contents.modes.filter(({ modeId }) => used.has(modeId)).map((mode) => mode.instrument.id)),
  ]
}
