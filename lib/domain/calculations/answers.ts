import { z } from 'zod'

/** Shapes of the answers of the public calculations, for their description; a test holds the answers to them. */

const maybe = z.number().nullable()
const engine = z.string().describe('Version of the engine: it changes whenever a number can.')

const parameters = {
  name: z.string(),
  H0: z.number().describe('km/s/Mpc'),
  Om0: z.number().describe('Baryons and dark matter, without massive neutrinos'),
  Ode0: z.number(),
  Ok0: z.number(),
  w0: z.number(),
  wa: z.number(),
  Tcmb0: z.number().describe('K'),
  Neff: z.number(),
  mNu: z.array(z.number()).describe('eV, one a species'),
}

const universe = z.object({
  shape: z.enum(['flat', 'open', 'closed']),
  origin: z.enum(['big-bang', 'bounce', 'no-beginning']),
  fate: z.enum(['expands-forever', 'recollapses', 'big-rip']),
  ageGyr: maybe,
  turnaroundRedshift: maybe,
  turnaroundGyr: maybe,
  greatestSizeInGyr: maybe,
  greatestSizeAgeGyr: maybe,
  recollapseAgeGyr: maybe,
  ripInGyr: maybe,
  acceleratingSinceRedshift: maybe,
  accelerating: z.boolean(),
  loitering: z.boolean(),
  loiteringRedshift: maybe,
  sentence: z.string(),
})

const row = z.object({
  z: z.number(),
  E: z.number(),
  hubbleKmSMpc: z.number(),
  comovingMpc: z.number(),
  transverseComovingMpc: z.number(),
  angularDiameterMpc: z.number(),
  luminosityMpc: z.number(),
  distanceModulusMag: maybe.describe('null at z = 0'),
  lookbackGyr: z.number(),
  ageGyr: maybe.describe('null where there was no big bang'),
  comovingVolumeMpc3: z.number(),
  differentialVolumeMpc3Sr: z.number(),
  kpcPerArcsec: z.number(),
  criticalDensityGCm3: z.number(),
  Om: z.number(),
  Ode: z.number(),
  Ok: z.number(),
  q: z.number(),
  Or: z.number(),
  kpcComovingPerArcsec: z.number(),
  dimmingMag: z.number(),
})

export const cosmologyAnswer = z.object({
  engine,
  cosmology: z.object(parameters),
  universe,
  rows: z.array(row),
  pairs: z.array(z.object({ z1: z.number(), z2: z.number(), angularDiameterMpc: z.number() })),
})

export const inverseAnswer = z.object({
  engine,
  cosmology: z.object(parameters),
  quantity: z.string(),
  rows: z.array(
    z.object({
      value: z.number(),
      redshifts: z.array(z.number()).describe('All of them; none is an empty list'),
    }),
  ),
})

export const cosmologiesAnswer = z.object({
  cosmologies: z.array(
    z.object({
      id: z.string(),
      citation: z.string(),
      standing: z.enum(['current', 'limiting']),
      ...parameters,
    }),
  ),
})

export const positionsAnswer = z.object({
  engine,
  instants: z.array(
    z.looseObject({
      at: z.string(),
      lastHours: z.number(),
      sunAltitudeDeg: z.number(),
      moonAltitudeDeg: z.number(),
      moonIllumination: z.number(),
      targets: z.array(z.looseObject({ id: z.string(), altitudeDeg: z.number(), azimuthDeg: z.number() })),
    }),
  ),
})

export const visibilityAnswer = z.object({
  engine,
  nights: z.array(z.looseObject({ date: z.string(), darkHours: z.number(), moonIllumination: z.number() })),
  targets: z.array(
    z.object({
      id: z.string(),
      totalHours: z.number(),
      byNight: z.array(z.number()),
      windows: z.array(z.array(z.array(z.string()))),
    }),
  ),
})

export const ccdAnswer = z.object({ engine, snr: z.number(), timeS: z.number() })

/** RFC 9457, with a JSON pointer for each value that is wrong. */
export const problemAnswer = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string(),
  instance: z.string(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
})
