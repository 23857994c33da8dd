/** What each field of the cosmology is called. */
export const cosmologyLabels = {
  choice: 'Cosmology',
  comparison: 'Beside it',
  name: 'Name',
  H0: 'H₀',
  Om0: 'Ωm',
  omCounts: 'Ωm counts',
  Ode0: 'ΩΛ',
  w0: 'w₀',
  wa: 'wₐ',
  Tcmb0: 'Temperature',
  Neff: 'Species',
  mNuEv: 'Masses',
}
