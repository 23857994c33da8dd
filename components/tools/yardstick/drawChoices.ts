import { quantityOf } from '@/lib/domain/tools/yardstick/quantities'
import type { CosmologyQuantity } from '@/lib/science/cosmology'

const usual: readonly { value: CosmologyQuantity; label: string }[] = [
  { value: 'angularDiameterMpc', label: 'angular-diameter distance' },
  { value: 'luminosityMpc', label: 'luminosity distance' },
  { value: 'lookbackGyr', label: 'light left' },
  { value: 'ageGyr', label: 'age' },
  { value: 'comovingVolumeMpc3', label: 'volume' },
  { value: 'kpcPerArcsec', label: 'scale' },
  { value: 'hubbleKmSMpc', label: 'expansion rate' },
]

/** What can be drawn: the usual quantities, and whatever the address asks besides. */
export function drawChoices(
  chosen: CosmologyQuantity,
): readonly { value: CosmologyQuantity; label: string }[] {
  if (usual.some(({ value }) => value === chosen)) return usual
  return [...usual, { value: chosen, label: quantityOf(chosen)?.name ?? chosen }]
}
