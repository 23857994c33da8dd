'use client'

import { useMemo } from 'react'
import { Facts } from '@/components/ui/Facts'
import { ABSENT, formatNumber, formatSigned } from '@/lib/format'
import { cosmologyFormSchema, type CosmologyForm } from '@/lib/domain/proposals/cosmologyForm'
import { createCosmology } from '@/lib/science/cosmology'

/** The universe that was typed, worked out in the browser; null while the form does not make one. */
function universeOf(form: CosmologyForm) {
  const read = cosmologyFormSchema.safeParse(form)
  return read.success ? createCosmology(read.data.parameters) : null
}

/** What the universe typed is like: its curvature, age and fate, as one types. */
export function UniverseNote({ form }: { form: CosmologyForm }) {
  const universe = useMemo(() => universeOf(form), [form])
  if (!universe)
    return (
      <p className="m-0 text-table text-muted">What is typed makes no universe yet. The fields say why.</p>
    )
  const { parameters, Ok0, Ode0 } = universe
  const age = universe.universe.ageGyr
  return (
    <div aria-live="polite">
      <p className="mb-4 text-body">{universe.universe.sentence}</p>
      <Facts
        facts={[
          { term: 'H₀', value: `${formatNumber(parameters.H0, 2)} km/s/Mpc` },
          { term: 'Matter, Ωm', value: formatNumber(parameters.Om0, 5) },
          { term: 'Dark energy, ΩΛ', value: formatNumber(Ode0, 5) },
          { term: 'Curvature, Ωk', value: Ok0 === 0 ? 'exactly 0, flat' : formatSigned(Ok0, 5) },
          { term: 'Age', value: age === null ? ABSENT : `${formatNumber(age, 2)} Gyr` },
          {
            term: 'Scale at z = 1',
            value:
              universe.deepestRedshift > 1 ? `${formatNumber(universe.kpcPerArcsec(1), 3)} kpc/″` : ABSENT,
          },
          {
            term: (
              <>
                D<sub>L</sub> at z = 1
              </>
            ),
            value:
              universe.deepestRedshift > 1 ? `${formatNumber(universe.luminosityMpc(1), 1)} Mpc` : ABSENT,
          },
        ]}
      />
    </div>
  )
}
