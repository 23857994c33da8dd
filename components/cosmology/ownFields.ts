/** The parameters of a cosmology of one's own, in the order a person thinks of them, as every form names them. */
export const ownFields = [
  { name: 'H0', label: 'H₀', help: 'Hubble constant', unit: 'km/s/Mpc' },
  { name: 'Om0', label: 'Ωm', help: 'Matter now', unit: undefined },
  { name: 'Ode0', label: 'ΩΛ', help: 'Dark energy; empty: flat', unit: undefined },
  { name: 'w0', label: 'w₀', help: '−1: a constant', unit: undefined },
  { name: 'wa', label: 'wₐ', help: 'How w drifts; 0 keeps it', unit: undefined },
  { name: 'Tcmb0', label: 'Background', help: 'Temperature; 0 for none', unit: 'K' },
  { name: 'Neff', label: 'Neutrino species', help: 'Effective number', unit: undefined },
  { name: 'mNuEv', label: 'Neutrino masses', help: 'One a species', unit: 'eV' },
] as const

/** The question a published matter density must be asked. */
export const omQuestion = {
  label: 'Does this Ωm count the neutrinos?',
  options: [
    { value: 'matter', label: 'No', help: 'Baryons and dark matter alone, as here' },
    { value: 'all', label: 'Yes', help: 'As many papers print it; their share is taken out' },
  ],
} as const
