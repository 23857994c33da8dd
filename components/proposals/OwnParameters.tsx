'use client'

import { NumberField } from '@/components/forms/NumberField'
import { TextField } from '@/components/forms/TextField'

/** The parameters of a cosmology of one's own, in the order a person thinks of them. */
export function OwnParameters() {
  return (
    <fieldset className="m-0 flex flex-col gap-5 border-0 border-l-4 border-accent p-0 pl-5">
      <legend className="sr-only">Own parameters</legend>
      <TextField name="name" label="Name" help="As it stands in tables and in the packet." width="medium" />
      <div className="grid gap-5 sm:grid-cols-2">
        <NumberField name="H0" label="H₀" help="Hubble constant" unit="km/s/Mpc" width="medium" />
        <NumberField name="Om0" label="Ωm" help="Matter without neutrinos" />
        <NumberField name="Ode0" label="ΩΛ" help="Dark energy; empty makes it exactly flat" optional />
        <NumberField name="w0" label="w₀" help="−1 is a cosmological constant" />
        <NumberField name="wa" label="wₐ" help="How w drifts; 0 keeps it" />
        <NumberField
          name="Tcmb0"
          label="Temperature of the background"
          help="0 leaves radiation out"
          unit="K"
        />
        <NumberField name="Neff" label="Neutrino species" help="Effective number" />
        <TextField
          name="mNuEv"
          label="Neutrino masses"
          help="One a species, parted by commas"
          unit="eV"
          width="medium"
          optional
        />
      </div>
    </fieldset>
  )
}
