import { z } from 'zod'
import {
  cosmologyPresets,
  createCosmology,
  parameterTroubles,
  presetCosmology,
  type Cosmology,
  type CosmologyParameters,
} from '@/lib/science/cosmology'
import { refuse } from '@/lib/errors'
import { asRefused } from './asRefused'
import { exactly } from './exactly'

const number = z.number('This is a number.')

/** A preset by its id, or the parameters of any universe; `flat: true` derives Ode0. Masses in eV, one a species. */
export const cosmologyInput = z.union(
  [
    z.string().max(40),
    exactly({
      name: z.string().max(60).optional(),
      H0: number,
      Om0: number,
      Ode0: number.optional(),
      w0: number.optional(),
      wa: number.optional(),
      Tcmb0: number.optional(),
      Neff: number.optional(),
      mNu: z.array(number).max(10).optional(),
      flat: z.boolean().optional(),
    }),
  ],
  {
    error: (issue) => {
      const unknown =
        issue.code === 'invalid_union' && issue.errors.flat().find(({ code }) => code === 'unrecognized_keys')
      return unknown ? unknown.message : 'Give the id of a preset, or H0, Om0 and Ode0 (or flat: true).'
    },
  },
)

export type CosmologyInput = z.output<typeof cosmologyInput>

/** The universe asked for; refused at /cosmology when there is none. */
export function universeOf(given: CosmologyInput): Cosmology {
  if (typeof given === 'string') {
    const known = cosmologyPresets.some(({ id }) => id === given)
    if (!known) throw refuse.field('cosmology', `No cosmology is called “${given}”.`)
    return presetCosmology(given)
  }
  const { flat = false, Ode0, Tcmb0 = 0 } = given
  if (flat && Ode0 !== undefined)
    throw refuse.field('cosmology.Ode0', 'Give either Ode0 or flat: true, not both.')
  if (!flat && Ode0 === undefined) throw refuse.field('cosmology.Ode0', 'Give Ode0, or flat: true.')
  const parameters: CosmologyParameters = {
    name: given.name ?? 'As given',
    H0: given.H0,
    Om0: given.Om0,
    Ode0: flat ? 'flat' : (Ode0 ?? 'flat'),
    w0: given.w0 ?? -1,
    wa: given.wa ?? 0,
    Tcmb0,
    Neff: given.Neff ?? (Tcmb0 > 0 ? 3.046 : 0),
    mNuEv: given.mNu ?? [],
  }
  const wrong = Object.entries(parameterTroubles(parameters)).map(([key, sentence]) => [
    `cosmology.${key === 'mNuEv' ? 'mNu' : key}`,
    sentence,
  ])
  if (wrong.length > 0)
    throw refuse.invalid(
      'No universe has these parameters.',
      Object.fromEntries(wrong) as Record<string, string>,
    )
  return asRefused('cosmology', () => createCosmology(parameters))
}
