import { z } from 'zod'
import { cosmologyPresets, findPreset, matterWithoutNeutrinos } from '@/lib/science/cosmology'
import { readNumber } from '@/lib/science/redshift'
import { ScienceError } from '@/lib/science/ScienceError'
import { cosmologyProblem } from './cosmologyProblem'
import type { ChosenCosmology } from './types'

const presetIds = cosmologyPresets.map(({ id }) => id as string)
const presetNames = cosmologyPresets.map(({ parameters }) => parameters.name.toLowerCase())
const isPreset = (id: string) => presetIds.includes(id)

/** The form as typed. Parameters count only when the choice is `custom`; they stay typed when it is not. */
const typed = z.object({
  choice: z.string().refine((id) => id === 'custom' || isPreset(id), 'Choose a cosmology.'),
  comparison: z.string().refine((id) => id === '' || isPreset(id), 'Choose a cosmology to stand beside it.'),
  name: z.string().max(60, 'A name has at most 60 characters.'),
  H0: z.string().max(40),
  Om0: z.string().max(40),
  /** Whether the matter density typed counts massive neutrinos; the engine's own never does. */
  omCounts: z.enum(['matter', 'all']).optional(),
  Ode0: z.string().max(40),
  w0: z.string().max(40),
  wa: z.string().max(40),
  Tcmb0: z.string().max(40),
  Neff: z.string().max(40),
  mNuEv: z.string().max(120),
})

export type CosmologyForm = z.input<typeof typed>

const whatItIs = {
  H0: 'The Hubble constant is a number, in km/s/Mpc.',
  Om0: 'The density of matter is a number.',
  Ode0: 'The density of dark energy is a number; leave it empty for a flat universe.',
  w0: 'w₀ is a number; −1 is a cosmological constant.',
  wa: 'wₐ is a number; 0 keeps dark energy as it is.',
  Tcmb0: 'The temperature of the background is a number, in kelvin; 0 leaves radiation out.',
  Neff: 'The number of neutrino species is a number.',
} as const

type Named = keyof typeof whatItIs

/** The parameters typed, or the field that cannot be read. */
function parametersOf(
  form: CosmologyForm,
): ChosenCosmology['parameters'] | { field: string; sentence: string } {
  const numbers: Partial<Record<Named, number>> = {}
  for (const [field, sentence] of Object.entries(whatItIs) as [Named, string][]) {
    if (field === 'Ode0' && form.Ode0.trim() === '') continue
    const value = readNumber(form[field])
    if (value === null) return { field, sentence }
    numbers[field] = value
  }
  const masses = form.mNuEv.split(/[\s,;]+/).filter(Boolean)
  const mNuEv = masses.map(readNumber)
  if (mNuEv.some((mass) => mass === null))
    return { field: 'mNuEv', sentence: 'Give the masses in eV, parted by commas: 0, 0, 0.06.' }
  const parameters: ChosenCosmology['parameters'] = {
    name: form.name.trim() || 'Own parameters',
    H0: numbers.H0 ?? 0,
    Om0: numbers.Om0 ?? 0,
    Ode0: numbers.Ode0 ?? 'flat',
    w0: numbers.w0 ?? -1,
    wa: numbers.wa ?? 0,
    Tcmb0: numbers.Tcmb0 ?? 0,
    Neff: numbers.Neff ?? 0,
    mNuEv: mNuEv.map((mass) => mass ?? 0),
  }
  return form.omCounts === 'all' ? withoutNeutrinos(parameters) : parameters
}

/** The same universe from a matter density that counts its massive neutrinos. */
function withoutNeutrinos(
  parameters: ChosenCosmology['parameters'],
): ChosenCosmology['parameters'] | { field: string; sentence: string } {
  const { H0, Om0, Tcmb0, Neff, mNuEv } = parameters
  // A wrong parameter is named by itself, at its own field.
  if (cosmologyProblem(parameters)) return parameters
  try {
    const given = { H0KmSMpc: H0, publishedOm: Om0, Tcmb0K: Tcmb0, Neff, mNuEv }
    return { ...parameters, Om0: matterWithoutNeutrinos(given) }
  } catch (error) {
    if (error instanceof ScienceError) return { field: 'Om0', sentence: error.message }
    throw error
  }
}

function understood(form: CosmologyForm, ctx: z.RefinementCtx): ChosenCosmology {
  const comparisonId = form.comparison === '' || form.comparison === form.choice ? null : form.comparison
  if (form.choice !== 'custom') {
    const { mNuEv, ...parameters } = findPreset(form.choice).parameters
    return { id: form.choice, parameters: { ...parameters, mNuEv: [...mNuEv] }, comparisonId }
  }
  if (presetNames.includes(form.name.trim().toLowerCase())) {
    ctx.addIssue({
      code: 'custom',
      path: ['name'],
      message: 'A published cosmology has this name. Choose another.',
    })
    return z.NEVER
  }
  const parameters = parametersOf(form)
  const problem = 'sentence' in parameters ? parameters : cosmologyProblem(parameters)
  if (problem) ctx.addIssue({ code: 'custom', path: [problem.field], message: problem.sentence })
  if ('sentence' in parameters) return z.NEVER
  return { id: 'custom', parameters, comparisonId }
}

/** What was typed, as a cosmology the engine can compute with; its refusal stands at the field that caused it. */
export const cosmologyFormSchema = typed.transform(understood)

const text = (value: number) => String(value).replace('-', '−')

/** A stored choice as it stands in the form. */
export function cosmologyFormOf({ id, parameters: p, comparisonId }: ChosenCosmology): CosmologyForm {
  return {
    choice: id,
    comparison: comparisonId ?? '',
    name: id === 'custom' ? p.name : '',
    H0: text(p.H0),
    Om0: text(p.Om0),
    omCounts: 'matter',
    Ode0: p.Ode0 === 'flat' ? '' : text(p.Ode0),
    w0: text(p.w0),
    wa: text(p.wa),
    Tcmb0: text(p.Tcmb0),
    Neff: text(p.Neff),
    mNuEv: p.mNuEv.map(text).join(', '),
  }
}
