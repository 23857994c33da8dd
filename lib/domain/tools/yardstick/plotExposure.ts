import { plotRatio, type CurvePlot } from './curves'
import type { ReadyUniverse } from './universes'

/** Exposure time of a source of given luminosity where the sky limits, over the reference's: the distance's to the fourth. */
export function plotExposure(
  universes: readonly ReadyUniverse[],
  reference: ReadyUniverse,
  redshifts: readonly number[],
): CurvePlot {
  const plot = plotRatio(universes, reference, 'luminosityMpc', redshifts)
  return {
    ...plot,
    curves: plot.curves.map((curve) => ({
      ...curve,
      points: curve.points.map(([z, ratio]): [number, number] => [z, ratio ** 4]),
    })),
  }
}
