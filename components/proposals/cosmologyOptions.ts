import { cosmologyPresets } from '@/lib/science/cosmology'
import { formatNumber } from '@/lib/format'

/** The published cosmologies with where they are printed, then one's own. */
export const cosmologyChoices = [
  ...cosmologyPresets.map(({ id, parameters, citation, standing }) => {
    const numbers = `H₀ ${formatNumber(parameters.H0, 2)}, Ωm ${formatNumber(parameters.Om0, 3)}`
    const limit = standing === 'limiting' ? '. A limiting case' : ''
    return { value: id as string, label: parameters.name, help: `${numbers}. ${citation}${limit}.` }
  }),
  { value: 'custom', label: 'Own parameters', help: 'Any universe the equations allow, curved or not.' },
]

export const comparisonChoices = cosmologyPresets.map(({ id, parameters }) => ({
  value: id as string,
  label: parameters.name,
}))
