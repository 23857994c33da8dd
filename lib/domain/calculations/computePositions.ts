import { z } from 'zod'
import { positionsAt, skyEngineVersion } from '@/lib/science/sky'
import { asRefused } from './asRefused'
import { exactly } from './exactly'
import { listOf, mostInstants, mostTargets } from './limits'
import { requireOwnIds, siteInput, targetInput } from './skySchema'

export const positionsRequest = exactly({
  site: siteInput,
  targets: listOf(targetInput, mostTargets, 'targets'),
  instants: listOf(
    z.iso.datetime({ offset: true, error: 'An instant is written as 2027-07-01T03:00:00Z.' }),
    mostInstants,
    'instants',
  ),
})

export type PositionsRequest = z.output<typeof positionsRequest>

/** Where Sun, Moon and targets stand at each instant. */
export function computePositions({ site, targets, instants }: PositionsRequest) {
  requireOwnIds(targets)
  const found = asRefused('instants', () =>
    positionsAt({ site, targets, instants: instants.map((at) => new Date(at)) }),
  )
  return {
    engine: skyEngineVersion,
    instants: found.map(({ at, ...rest }) => ({ at: at.toISOString(), ...rest })),
  }
}
