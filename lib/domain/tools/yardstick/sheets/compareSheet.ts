import type { CosmologyQuantity } from '@/lib/science/cosmology'
import { quantityOf } from '../quantities'
import { readQuantity, type Reading } from '../reading'
import type { ReadyUniverse } from '../universes'
import { redshiftColumn } from './redshiftColumn'
import { withDecimals, type Sheet, type SheetCell, type SheetColumn } from './sheet'

/** Magnitudes are set against one another as a difference, everything else as a ratio. */
const isDifference = (column: CosmologyQuantity) => column === 'distanceModulusMag'

/** One reading against the reference's. */
function against(
  column: CosmologyQuantity,
  one: Reading,
  reference: Reading,
  referenceName: string,
): SheetCell {
  if (one.absent) return { value: null, absent: one.absent }
  if (reference.absent)
    return {
      value: null,
      absent: { words: `none under ${referenceName}`, sentence: reference.absent.sentence },
    }
  if (isDifference(column)) return { value: one.value - reference.value }
  if (reference.value === 0)
    return { value: null, absent: { words: '0 under both', sentence: 'A ratio to 0 has no value.' } }
  return { value: one.value / reference.value }
}

/**
 * How an exposure time of a source of given luminosity changes with the luminosity distance: as its square where
 * the source's own light limits the noise (t goes as 1/flux), as its fourth power where the sky does (1/flux²).
 */
const exposures = [
  { id: 'timeSource', power: 2, unit: 'own light limits', latex: 't_\\mathrm{source}' },
  { id: 'timeSky', power: 4, unit: 'sky limits', latex: 't_\\mathrm{sky}' },
] as const

function columnsOf(
  columns: readonly CosmologyQuantity[],
  { place, name }: ReadyUniverse,
  referenceName: string,
): SheetColumn[] {
  const under = `under ${name} against ${referenceName}`
  return [
    ...columns.map((id): SheetColumn => {
      const quantity = quantityOf(id)
      const difference = isDifference(id)
      return {
        id: `${id}_${difference ? 'difference' : 'ratio'}_${place + 1}`,
        head: quantity?.head ?? id,
        below: quantity?.below,
        unit: difference ? 'difference, mag' : 'ratio',
        fileUnit: difference ? 'mag' : '',
        description: `${quantity?.name ?? id}, ${difference ? 'difference' : 'ratio'} ${under}`,
        latex: quantity?.latex ?? null,
        decimals: difference ? 3 : 4,
        place,
      }
    }),
    ...exposures.map(({ id, unit, power, latex }): SheetColumn => ({
      id: `${id}_ratio_${place + 1}`,
      head: 'exposure',
      unit,
      fileUnit: '',
      description: `exposure time of a source of given luminosity, ${unit}, D_L to the power ${power}, ${under}`,
      latex,
      decimals: 4,
      place,
    })),
  ]
}

/** Every universe set against the reference, with what that does to exposure times. */
export function compareSheet(
  redshifts: readonly number[],
  universes: readonly ReadyUniverse[],
  reference: ReadyUniverse,
  columns: readonly CosmologyQuantity[],
): Sheet {
  const others = universes.filter(({ place }) => place !== reference.place)
  const cellsOf = (z: number, { cosmology }: ReadyUniverse): SheetCell[] => {
    const cell = (column: CosmologyQuantity) =>
      against(
        column,
        readQuantity(cosmology, column, z),
        readQuantity(reference.cosmology, column, z),
        reference.name,
      )
    const distance = cell('luminosityMpc')
    return [
      ...columns.map(cell),
      ...exposures.map(({ power }): SheetCell =>
        typeof distance.value === 'number' ? { value: distance.value ** power } : distance,
      ),
    ]
  }
  return withDecimals({
    title: `Against ${reference.name}`,
    columns: [
      redshiftColumn(redshifts),
      ...others.flatMap((universe) => columnsOf(columns, universe, reference.name)),
    ],
    rows: redshifts.map((z, id) => ({
      id,
      cells: [{ value: z }, ...others.flatMap((universe) => cellsOf(z, universe))],
    })),
  })
}
