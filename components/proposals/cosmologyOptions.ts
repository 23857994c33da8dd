import { cosmologyPresets } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'

/** The published cosmologies with where they are printed, then one's own. */
export const cosmologyChoices = [
  ...cosmologyPresets.map(({ id, parameters, citation, standing }) => ({
    value: id as string,
    label: `${parameters.name}, H₀ ${formatNumber(parameters.H0, 2)}, Ωm ${formatNumber(parameters.Om0, 3)}`,
    help: standing === 'limiting' ? `${citation}. A limiting case.` : citation,
  })),
  { value: 'custom', label: 'Own parameters', help: 'Any universe the equations allow, curved or not.' },
]

export const comparisonChoices = cosmologyPresets.map(({ id, parameters }) => ({
  value: id as string,
  label: parameters.name,
}))
