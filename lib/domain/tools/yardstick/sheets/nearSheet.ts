import { cmbRedshift, heliocentricRedshift, nearbyDistance, type NearbyInput } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import type { ReadyUniverse } from '../universes'
import { redshiftColumn } from './redshiftColumn'
import { withDecimals, type Sheet, type SheetCell, type SheetColumn } from './sheet'

export type Surroundings = Omit<NearbyInput, 'redshift'>

const frames = {
  heliocentric: {
    id: 'z_heliocentric',
    unit: 'Sun’s frame',
    description: 'heliocentric redshift',
    latex: 'z_\\mathrm{hel}',
  },
  cmb: {
    id: 'z_cmb',
    unit: 'CMB frame',
    description: 'redshift in the frame of the microwave background',
    latex: 'z_\\mathrm{CMB}',
  },
} as const

const columnsOf = ({ place, name }: ReadyUniverse): SheetColumn[] => [
  {
    id: `luminosityMpc_${place + 1}`,
    head: 'D',
    below: 'L',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    description: `luminosity distance (1 + z_hel) D_M(z_cmb) under ${name}`,
    latex: 'D_\\mathrm{L}',
    decimals: 1,
    place,
  },
  {
    id: `luminosityErrorMpc_${place + 1}`,
    head: '±',
    unit: 'Mpc',
    fileUnit: 'Mpc',
    description: `error of the luminosity distance from own motion under ${name}`,
    latex: '\\sigma(D_\\mathrm{L})',
    decimals: 1,
    place,
  },
]

/** The distance, its error and what is left open; a refusal becomes the sentence of every cell. */
function cellsOf(redshift: number, { cosmology }: ReadyUniverse, around: Surroundings) {
  try {
    const near = nearbyDistance(cosmology, { ...around, redshift })
    const cells: SheetCell[] = [{ value: near.luminosityMpc }, { value: near.luminosityErrorMpc }]
    return { cells, share: near.errorShare, advice: near.advice }
  } catch (error) {
    if (!(error instanceof ScienceError)) throw error
    const absent = { words: 'no distance', sentence: error.message }
    const cells: SheetCell[] = [
      { value: null, absent },
      { value: null, absent },
    ]
    return { cells, share: null, advice: error.message }
  }
}

const inOtherFrame = (redshift: number, around: Surroundings): number =>
  around.frame === 'heliocentric' ? cmbRedshift(redshift, around) : heliocentricRedshift(redshift, around)

/** Distances of galaxies near by: both frames, the error from a galaxy's own motion, and when not to trust them. */
export function nearSheet(
  redshifts: readonly number[],
  universes: readonly ReadyUniverse[],
  around: Surroundings,
): Sheet {
  const other = around.frame === 'cmb' ? 'heliocentric' : 'cmb'
  return withDecimals({
    title: 'Near by',
    columns: [
      { ...redshiftColumn(redshifts), ...frames[around.frame] },
      { head: 'z', fileUnit: '', decimals: 5, place: null, ...frames[other] },
      ...universes.flatMap(columnsOf),
      {
        id: 'share',
        head: 'left open',
        unit: '% of the distance',
        fileUnit: '%',
        description: 'error over distance from own motion',
        latex: '\\sigma/D',
        decimals: 1,
        place: null,
      },
      {
        id: 'trust',
        head: 'a distance?',
        fileUnit: '',
        description: 'whether the redshift can be trusted as a distance',
        latex: null,
        decimals: null,
        place: null,
        words: true,
      },
    ],
    rows: redshifts.map((z, id) => {
      const under = universes.map((universe) => cellsOf(z, universe, around))
      const [first] = under
      const share: SheetCell = { value: typeof first?.share === 'number' ? first.share * 100 : null }
      const trust: SheetCell = first?.advice
        ? { value: first.advice, shown: 'no: measure it', caution: first.advice }
        : { value: 'yes' }
      return {
        id,
        cells: [
          { value: z },
          { value: inOtherFrame(z, around) },
          ...under.flatMap(({ cells }) => cells),
          share,
          trust,
        ],
      }
    }),
  })
}
