import { GRAVITATION_SI, MPC_KM, SPEED_OF_LIGHT_KM_S, STEFAN_BOLTZMANN_SI } from '../constants'

/** Critical density now, kg/m^3: 3 H0^2 / (8 pi G), H0 in km/s/Mpc. */
export function criticalDensityKgM3(H0: number): number {
  const perS = H0 / MPC_KM
  return (3 * perS * perS) / (8 * Math.PI * GRAVITATION_SI)
}

/** Density of the microwave background over the critical density now: 4 sigma T^4 / c^3, T in K. */
export function photonDensity(H0: number, Tcmb0: number): number {
  const c = SPEED_OF_LIGHT_KM_S * 1e3
  return (4 * STEFAN_BOLTZMANN_SI * Tcmb0 ** 4) / c ** 3 / criticalDensityKgM3(H0)
}
