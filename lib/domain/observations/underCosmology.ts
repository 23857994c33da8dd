import { cosmologyPresets, presetCosmology } from '@/lib/science/cosmology'
import { computeProposal } from './computeProposal'
import { cosmologyOf } from './cosmologyOf'
import type { ReportContents } from './reportContents'
import type { ProposalComputation, Verdict } from './types'

export interface UnderCosmology<C extends ReportContents> {
  id: string
  name: string
  contents: C
  computation: ProposalComputation
  /** Observations whose verdict is another one there. */
  flips: { observationId: number; name: string; from: Verdict; to: Verdict }[]
}

/**
 * The same request in another universe; null when the preset is unknown. Magnitudes predicted from a luminosity are
 * rescaled with the distance, observed ones stay.
 */
export function underCosmology<C extends ReportContents>(
  contents: C,
  computation: ProposalComputation,
  presetId: string,
): UnderCosmology<C> | null {
  const preset = cosmologyPresets.find(({ id }) => id === presetId)
  if (!preset) return null
  const own = cosmologyOf(contents.cosmology.parameters)
  const other = presetCosmology(preset.id)
  const targets = contents.targets.map((target) => {
    const { brightness, redshift } = target
    if (brightness?.provenance !== 'predicted' || redshift === null || redshift <= 0) return target
    const shift = 5 * Math.log10(other.luminosityMpc(redshift) / own.luminosityMpc(redshift))
    return { ...target, brightness: { ...brightness, value: brightness.value + shift } }
  })
  const parameters = { ...preset.parameters, mNuEv: [...preset.parameters.mNuEv] }
  const there: C = { ...contents, targets, cosmology: { id: preset.id, parameters, comparisonId: null } }
  const computed = computeProposal(there)
  const flips = computed.observations.flatMap(({ observationId, targetId, verdict }) => {
    const here = computation.observations.find((one) => one.observationId === observationId)
    const name = contents.targets.find(({ id }) => id === targetId)?.name ?? ''
    return here && here.verdict !== verdict ? [{ observationId, name, from: here.verdict, to: verdict }] : []
  })
  return { id: preset.id, name: preset.parameters.name, contents: there, computation: computed, flips }
}
