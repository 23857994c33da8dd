import { createNeutrinos } from './neutrinos'
import type { CosmologyParameters } from './parameters'
import { criticalDensityKgM3, photonDensity } from './photons'

/** Densities of a model over the critical density now, as functions of x = ln(1+z). */
export interface Density {
  readonly Om0: number
  readonly Ode0: number
  readonly Ok0: number
  readonly Ogamma0: number
  /** Neutrinos now, massive ones included. */
  readonly Onu0: number
  /** Critical density now, g/cm^3: 3 H0^2 / (8 pi G). */
  readonly criticalDensity0GCm3: number
  /** E^2 = (H/H0)^2; `onePlusZ` spares an exponential where it is known. */
  E2(x: number, onePlusZ?: number): number
  /** d(E^2)/dx. */
  slopeE2(x: number): number
  /** E^2(x + d) - E^2(x), without cancellation for small d: what E^2 is next to a turn. */
  riseE2(x: number, d: number): number
  darkEnergy(x: number): number
  radiation(x: number): number
}

/** Sum of the densities of a model. Ode0 'flat' gives Ok0 exactly 0. */
export function createDensity(p: CosmologyParameters): Density {
  const Ogamma0 = photonDensity(p.H0, p.Tcmb0)
  const neutrinos = createNeutrinos(p)
  const Onu0 = Ogamma0 * neutrinos.ratio(0)
  const { Om0, w0, wa } = p
  const flat = p.Ode0 === 'flat'
  const Ode0 = p.Ode0 === 'flat' ? 1 - Om0 - Ogamma0 - Onu0 : p.Ode0
  const Ok0 = flat ? 0 : 1 - Om0 - Ode0 - Ogamma0 - Onu0
  // Without dark energy its exponent must not be looked at: it may overflow.
  const constant = (w0 === -1 && wa === 0) || Ode0 === 0
  const masslessRadiation = Ogamma0 + Onu0

  const darkEnergy = constant
    ? () => Ode0
    : (x: number) => Ode0 * Math.exp(3 * (1 + w0 + wa) * x + 3 * wa * Math.expm1(-x))
  const radiation = neutrinos.massive
    ? (x: number) => Ogamma0 * (1 + neutrinos.ratio(x)) * Math.exp(4 * x)
    : (x: number) => masslessRadiation * Math.exp(4 * x)

  return {
    Om0,
    Ode0,
    Ok0,
    Ogamma0,
    Onu0,
    criticalDensity0GCm3: criticalDensityKgM3(p.H0) / 1e3,
    darkEnergy,
    radiation,
    E2(x, onePlusZ = Math.exp(x)) {
      const radiationNow = neutrinos.massive ? Ogamma0 * (1 + neutrinos.ratio(x)) : masslessRadiation
      return ((radiationNow * onePlusZ + Om0) * onePlusZ + Ok0) * onePlusZ * onePlusZ + darkEnergy(x)
    },
    riseE2(x, d) {
      const onePlusZ = Math.exp(x)
      const exponent = 3 * (1 + w0 + wa) * d + 3 * wa * Math.expm1(-d) * Math.exp(-x)
      return (
        (neutrinos.massive
          ? radiation(x + d) - radiation(x)
          : masslessRadiation * onePlusZ ** 4 * Math.expm1(4 * d)) +
        Om0 * onePlusZ ** 3 * Math.expm1(3 * d) +
        Ok0 * onePlusZ ** 2 * Math.expm1(2 * d) +
        (constant ? 0 : darkEnergy(x) * Math.expm1(exponent))
      )
    },
    slopeE2(x) {
      const onePlusZ = Math.exp(x)
      return (
        4 * radiation(x) +
        Ogamma0 * neutrinos.slope(x) * onePlusZ ** 4 +
        3 * Om0 * onePlusZ ** 3 +
        2 * Ok0 * onePlusZ ** 2 +
        (constant ? 0 : darkEnergy(x) * (3 * (1 + w0 + wa) - 3 * wa * Math.exp(-x)))
      )
    },
  }
}
