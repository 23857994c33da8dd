import type { CosmologyQuantity } from '@/lib/science/cosmology'
import { quantityOf } from '../quantities'
import { readQuantity } from '../reading'
import type { ReadyUniverse } from '../universes'
import { redshiftColumn } from './redshiftColumn'
import { withDecimals, type Sheet, type SheetCell, type SheetColumn } from './sheet'

function columnOf(id: CosmologyQuantity, { place, name }: ReadyUniverse): SheetColumn {
  const quantity = quantityOf(id)
  return {
    id: `${id}_${place + 1}`,
    head: quantity?.head ?? id,
    below: quantity?.below,
    unit: quantity?.unit,
    fileUnit: quantity?.fileUnit ?? '',
    description: `${quantity?.name ?? id} under ${name}`,
    latex: quantity?.latex ?? null,
    decimals: quantity?.decimals ?? null,
    place,
    quantity: id,
  }
}

/** The chosen quantities at each redshift under each universe, in the order typed and chosen. */
export function distancesSheet(
  redshifts: readonly number[],
  universes: readonly ReadyUniverse[],
  columns: readonly CosmologyQuantity[],
): Sheet {
  return withDecimals({
    title: 'Distances, times and sizes',
    columns: [
      redshiftColumn(redshifts),
      ...universes.flatMap((universe) => columns.map((column) => columnOf(column, universe))),
    ],
    rows: redshifts.map((z, id) => ({
      id,
      cells: [
        { value: z },
        ...universes.flatMap(({ cosmology }) =>
          columns.map((column): SheetCell => {
            const { value, absent } = readQuantity(cosmology, column, z)
            return absent ? { value, absent } : { value }
          }),
        ),
      ],
    })),
  })
}
