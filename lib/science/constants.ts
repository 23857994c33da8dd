/** Physical constants. CODATA 2018; IAU 2012 astronomical unit; IAU 2015 parsec; Julian year. SI unless the name says otherwise. */

/** Speed of light, km/s. Exact. */
export const SPEED_OF_LIGHT_KM_S = 299_792.458

/** Newtonian constant of gravitation, m^3 kg^-1 s^-2. CODATA 2018. */
export const GRAVITATION_SI = 6.6743e-11

/** Stefan-Boltzmann constant, W m^-2 K^-4. CODATA 2018, from exact constants. */
export const STEFAN_BOLTZMANN_SI = 5.670374419e-8

/** Boltzmann constant, eV/K. CODATA 2018, from exact constants. */
export const BOLTZMANN_EV_K = 8.617333262145179e-5

/** Planck constant, erg s. Exact. */
export const PLANCK_ERG_S = 6.62607015e-27

/** Megaparsec in kilometres: 648000/pi astronomical units of 149 597 870.7 km, a million times. */
export const MPC_KM = (149_597_870.7 * 648_000 * 1e6) / Math.PI

/** A billion Julian years in seconds. */
export const GYR_S = 365.25 * 86_400 * 1e9

/** One arcsecond in radians. */
export const ARCSEC_RAD = Math.PI / 648_000

/** One degree in radians. */
export const DEG_RAD = Math.PI / 180
