import type { InvertibleQuantity } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import type { TypedValue } from '../inverseFields'
import { quantityOf } from '../quantities'
import type { ReadyUniverse } from '../universes'
import { withDecimals, type Sheet, type SheetCell, type SheetColumn } from './sheet'

/** Why no redshift has the value, in a few words. */
function noneWords(quantity: InvertibleQuantity, value: number, { cosmology, name }: ReadyUniverse): string {
  const { ageGyr, origin } = cosmology.universe
  if (value < 0 && quantity !== 'distanceModulusMag') return 'in no past'
  if (quantity === 'ageGyr' && origin === 'bounce') return 'no big bang to count from'
  if (quantity === 'ageGyr' && ageGyr !== null && value > ageGyr) return `${name} is younger`
  if (quantity === 'lookbackGyr') return origin === 'big-bang' ? 'before the big bang' : 'before the turn'
  return quantity === 'angularDiameterMpc' ? 'nothing is that far' : 'beyond the last redshift'
}

/** Every redshift with the value; none where the universe has no such quantity at all, as without a beginning. */
function rootsOf({ cosmology }: ReadyUniverse, quantity: InvertibleQuantity, value: number): number[] {
  try {
    return cosmology.redshiftsAt(quantity, value)
  } catch (error) {
    if (error instanceof ScienceError) return []
    throw error
  }
}

/** Distances seen across the sky rise and fall again, so a value may have several redshifts. */
function most(found: readonly number[][]): number {
  return Math.max(1, ...found.map((roots) => roots.length))
}

/** Redshifts at which a quantity has each value, under every universe. */
export function inverseSheet(
  values: readonly TypedValue[],
  universes: readonly ReadyUniverse[],
  id: InvertibleQuantity,
): Sheet {
  const quantity = quantityOf(id)
  const found = universes.map((universe) => values.map(({ value }) => rootsOf(universe, id, value)))
  const first: SheetColumn = {
    id,
    head: quantity?.head ?? id,
    below: quantity?.below,
    unit: quantity?.unit,
    fileUnit: quantity?.fileUnit ?? '',
    description: `${quantity?.name ?? id}, as given`,
    latex: quantity?.latex ?? null,
    decimals: quantity?.decimals ?? null,
    place: null,
  }
  const columns = universes.flatMap(({ place, name }, at) => {
    const many = most(found[at] ?? [])
    return Array.from({ length: many }, (_, root): SheetColumn => ({
      id: many === 1 ? `z_${place + 1}` : `z_${place + 1}_${root + 1}`,
      head: 'z',
      unit: many === 1 ? undefined : root === 0 ? 'nearer' : root === 1 ? 'and again' : `time ${root + 1}`,
      fileUnit: '',
      description: `redshift under ${name}${many === 1 ? '' : `, root ${root + 1}`}`,
      latex: 'z',
      decimals: 4,
      place,
    }))
  })
  const rows = values.map(({ value }, row) => ({
    id: row,
    cells: [
      { value },
      ...universes.flatMap((universe, at): SheetCell[] => {
        const roots = found[at]?.[row] ?? []
        return Array.from({ length: most(found[at] ?? []) }, (_, root): SheetCell => {
          const z = roots[root]
          if (z !== undefined) return { value: z }
          if (roots.length > 0) return { value: null }
          const words = noneWords(id, value, universe)
          return { value: null, absent: { words, sentence: `Under ${universe.name}: ${words}.` } }
        })
      }),
    ],
  }))
  return withDecimals({ title: `Redshifts from ${quantity?.name ?? id}`, columns: [first, ...columns], rows })
}
