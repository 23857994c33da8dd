import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { formatList, formatNumber } from '@/lib/format'
import { findPreset } from '@/lib/science/cosmology'

/** The model every distance in the packet rests on, with its parameters, and the one shown beside it. */
export function cosmologyLine({ cosmology }: Pick<AnonymousProposal, 'cosmology'>): string {
  const p = cosmology.parameters
  const masses = p.mNuEv.filter((mass) => mass > 0).map((mass) => formatNumber(mass, 2))
  const parts = [
    `H₀ ${formatNumber(p.H0, 2)} km/s/Mpc`,
    `Ωₘ ${formatNumber(p.Om0, 5)}`,
    p.Ode0 === 'flat' ? 'flat' : `ΩΛ ${formatNumber(p.Ode0, 5)}`,
    ...(p.w0 === -1 && p.wa === 0 ? [] : [`w₀ ${formatNumber(p.w0, 2)}`, `wₐ ${formatNumber(p.wa, 2)}`]),
    ...(p.Tcmb0 > 0
      ? [`T(CMB) ${formatNumber(p.Tcmb0, 4)} K`, `Nₑ ${formatNumber(p.Neff, 3)}`]
      : ['no radiation']),
    ...(masses.length > 0 ? [`neutrinos of ${formatList(masses)} eV`] : []),
  ]
  const line = `Distances under ${p.name}: ${parts.join(', ')}. Formulae of Hogg 1999; relative error below 10⁻⁸.`
  if (!cosmology.comparisonId) return line
  const beside = findPreset(cosmology.comparisonId).parameters
  return `${line} Shown beside it: ${beside.name}, H₀ ${formatNumber(beside.H0, 2)}, Ωₘ ${formatNumber(beside.Om0, 3)}.`
}
