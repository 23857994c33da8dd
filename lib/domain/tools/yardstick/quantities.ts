import type { CosmologyQuantity } from '@/lib/science/cosmology'

/** One quantity a reader can choose as a column or a plot. */
export interface Quantity {
  id: CosmologyQuantity
  /** In running words: `luminosity distance`. */
  name: string
  /** The head of its column: a letter with what stands below it, or a word. */
  head: string
  below?: string
  /** On the page. */
  unit: string
  /** In files, as Astropy and the Virtual Observatory read it. */
  fileUnit: string
  /** In LaTeX, within mathematics. */
  latex: string
  /** Fewest decimals; more are shown where small values need them. Null: significant figures. */
  decimals: number | null
  /** How it is computed, in one line, and where that is printed. */
  formula: string
  source: string
}

const hogg = (equation: number) => `Hogg 1999, astro-ph/9905116, eq. ${equation}`

export const quantities: readonly Quantity[] = [
  {
    id: 'luminosityMpc',
    name: 'luminosity distance',
    head: 'D',
    below: 'L',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    latex: 'D_\\mathrm{L}',
    decimals: 1,
    formula: 'D_L = (1 + z) D_M',
    source: hogg(21),
  },
  {
    id: 'angularDiameterMpc',
    name: 'angular-diameter distance',
    head: 'D',
    below: 'A',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    latex: 'D_\\mathrm{A}',
    decimals: 1,
    formula: 'D_A = D_M / (1 + z)',
    source: hogg(18),
  },
  {
    id: 'comovingMpc',
    name: 'comoving distance',
    head: 'D',
    below: 'C',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    latex: 'D_\\mathrm{C}',
    decimals: 1,
    formula: 'D_C = (c / H₀) ∫₀ᶻ dz′ / E(z′)',
    source: hogg(15),
  },
  {
    id: 'transverseComovingMpc',
    name: 'transverse comoving distance',
    head: 'D',
    below: 'M',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    latex: 'D_\\mathrm{M}',
    decimals: 1,
    formula: 'D_M = D_C in flat space, bent by Ωk elsewhere',
    source: hogg(16),
  },
  {
    id: 'distanceModulusMag',
    name: 'distance modulus',
    head: 'm − M',
    unit: 'mag',
    fileUnit: 'mag',
    latex: 'm - M',
    decimals: 2,
    formula: 'm − M = 5 log₁₀(D_L / 10 pc)',
    source: hogg(25),
  },
  {
    id: 'kpcPerArcsec',
    name: 'scale',
    head: 'scale',
    unit: 'kpc/″',
    fileUnit: 'kpc / arcsec',
    latex: '\\mathrm{scale}',
    decimals: 3,
    formula: 's = D_A · π / 648,000',
    source: hogg(18),
  },
  {
    id: 'kpcComovingPerArcsec',
    name: 'comoving scale',
    head: 'comoving scale',
    unit: 'kpc/″',
    fileUnit: 'kpc / arcsec',
    latex: '\\mathrm{comoving\\ scale}',
    decimals: 3,
    formula: 's = D_M · π / 648,000',
    source: hogg(16),
  },
  {
    id: 'lookbackGyr',
    name: 'lookback time',
    head: 'light left',
    unit: 'Gyr ago',
    fileUnit: 'Gyr',
    latex: 't_\\mathrm{L}',
    decimals: 2,
    formula: 't_L = (1 / H₀) ∫₀ᶻ dz′ / ((1 + z′) E(z′))',
    source: hogg(30),
  },
  {
    id: 'ageGyr',
    name: 'age',
    head: 'age then',
    unit: 'Gyr',
    fileUnit: 'Gyr',
    latex: 't',
    decimals: 3,
    formula: 't = (1 / H₀) ∫ᶻ dz′ / ((1 + z′) E(z′)), to infinity',
    source: hogg(30),
  },
  {
    id: 'comovingVolumeMpc3',
    name: 'comoving volume',
    head: 'volume',
    unit: 'Mpc³, whole sky',
    fileUnit: 'Mpc3',
    latex: 'V_\\mathrm{C}',
    decimals: null,
    formula: 'V_C = (4π / 3) D_M³ in flat space',
    source: hogg(29),
  },
  {
    id: 'differentialVolumeMpc3Sr',
    name: 'volume element',
    head: 'dV/dz dΩ',
    unit: 'Mpc³/sr',
    fileUnit: 'Mpc3 / sr',
    latex: '\\mathrm{d}V_\\mathrm{C}/\\mathrm{d}z\\,\\mathrm{d}\\Omega',
    decimals: null,
    formula: 'dV/dz dΩ = (c / H₀) D_M² / E(z)',
    source: hogg(28),
  },
  {
    id: 'hubbleKmSMpc',
    name: 'expansion rate',
    head: 'H(z)',
    unit: 'km/s/Mpc',
    fileUnit: 'km / (Mpc s)',
    latex: 'H(z)',
    decimals: 2,
    formula: 'H(z) = H₀ E(z)',
    source: hogg(14),
  },
  {
    id: 'E',
    name: 'expansion rate against now',
    head: 'E(z)',
    unit: 'H(z)/H₀',
    fileUnit: '',
    latex: 'E(z)',
    decimals: 4,
    formula: 'E² = Ωr + Ωm (1+z)³ + Ωk (1+z)² + Ωde f(z)',
    source: hogg(14),
  },
  {
    id: 'q',
    name: 'deceleration',
    head: 'q(z)',
    unit: 'below 0: speeding up',
    fileUnit: '',
    latex: 'q(z)',
    decimals: 4,
    formula: 'q = d ln H / d ln(1+z) − 1',
    source: 'From its definition, q = −ä a / ȧ²',
  },
  {
    id: 'Om',
    name: 'matter density',
    head: 'Ω',
    below: 'm',
    unit: 'of the whole, then',
    fileUnit: '',
    latex: '\\Omega_\\mathrm{m}(z)',
    decimals: 4,
    formula: 'Ωm(z) = Ωm (1+z)³ / E²',
    source: hogg(14),
  },
  {
    id: 'Ode',
    name: 'dark-energy density',
    head: 'Ω',
    below: 'Λ',
    unit: 'of the whole, then',
    fileUnit: '',
    latex: '\\Omega_\\Lambda(z)',
    decimals: 4,
    formula: 'Ωde(z) = Ωde f(z) / E²; Linder 2003, eq. 7',
    source: hogg(14),
  },
  {
    id: 'Ok',
    name: 'curvature',
    head: 'Ω',
    below: 'k',
    unit: 'of the whole, then',
    fileUnit: '',
    latex: '\\Omega_k(z)',
    decimals: 4,
    formula: 'Ωk(z) = Ωk (1+z)² / E²',
    source: hogg(14),
  },
  {
    id: 'criticalDensityGCm3',
    name: 'critical density',
    head: 'ρ',
    below: 'c',
    unit: 'g/cm³',
    fileUnit: 'g / cm3',
    latex: '\\rho_\\mathrm{c}',
    decimals: null,
    formula: 'ρ_c = 3 H(z)² / 8πG',
    source: 'From its definition; Hogg 1999, astro-ph/9905116, section 2',
  },
  {
    id: 'dimmingMag',
    name: 'surface-brightness dimming',
    head: 'dimming',
    unit: 'mag',
    fileUnit: 'mag',
    latex: '10\\log_{10}(1+z)',
    decimals: 2,
    formula: '10 log₁₀(1 + z)',
    source: 'Tolman 1930, PNAS 16, 511',
  },
]

export function quantityOf(id: string): Quantity | undefined {
  return quantities.find((quantity) => quantity.id === id)
}
