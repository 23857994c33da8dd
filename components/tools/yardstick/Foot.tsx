import { memo } from 'react'
import { citationLine } from '@/lib/domain/tools/yardstick/exports/citation'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { formatNumber } from '@/lib/format'

/** `H₀ 67.66, Ωm 0.30966, ΩΛ 0.68885, TCMB 2.7255 K, Neff 3.046, neutrinos of 0, 0, 0.06 eV`. */
function parameterWords({ cosmology }: ReadyUniverse): string {
  const { H0, Om0, w0, wa, Tcmb0, Neff, mNuEv } = cosmology.parameters
  return [
    `H₀ ${formatNumber(H0, 2)} km/s/Mpc`,
    `Ωm ${formatNumber(Om0, 5)}`,
    `ΩΛ ${formatNumber(cosmology.Ode0, 5)}`,
    ...(w0 === -1 && wa === 0 ? [] : [`w₀ ${formatNumber(w0, 3)}`, `wₐ ${formatNumber(wa, 3)}`]),
    Tcmb0 === 0 ? 'no radiation' : `background ${Tcmb0} K, ${Neff} neutrino species`,
    ...(mNuEv.some((mass) => mass > 0) ? [`of ${mNuEv.join(', ')} eV`] : []),
  ].join(', ')
}

/** The parameters behind the numbers, how good they are, and the line to cite them by. */
export const Foot = memo(function Foot({ universes }: { universes: readonly ReadyUniverse[] }) {
  return (
    <div className="mt-6 grid gap-x-12 gap-y-5 text-caption text-muted md:grid-cols-2">
      <ul className="plain-list flex flex-col gap-1">
        {universes.map((universe) => (
          <li key={universe.place}>
            <strong className="font-semibold text-ink">{universe.name}</strong>: {parameterWords(universe)}.
          </li>
        ))}
      </ul>
      <div>
        <p className="m-0 [overflow-wrap:anywhere]">
          <strong className="font-semibold text-ink">To cite</strong>: {citationLine(universes)}
        </p>
        <p className="mt-2 mb-0">
          Relative error below 10⁻⁸ to z = 20 and 10⁻⁶ to z = 1100. Press a number for its formula and source.
        </p>
      </div>
    </div>
  )
})
