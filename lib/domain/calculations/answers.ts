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

const through = z.number().describe('Share of the light, 0 to 1')

export const lightAnswer = z.object({
  engine,
  cosmology: z.object(parameters),
  z: z.number(),
  magnitude: z
    .object({
      apparentAb: z.number().describe('With dust and lens; the intergalactic medium is told by wavelength'),
      errorMag: z.number().describe('From the error of the magnification'),
      absoluteAb: z.number(),
      distanceModulusMag: z.number(),
      kCorrectionMag: z.number(),
      withoutDustOrLensAb: z.number(),
      dustMag: z.number(),
      magnificationMag: z.number().describe('Negative where the lens makes it brighter'),
    })
    .nullable(),
  line: z
    .object({
      observedWavelengthA: maybe,
      withoutDustOrLensErgSCm2: z.number(),
      dustMag: z.number(),
      magnificationMag: z.number(),
      fluxErgSCm2: z.number().describe('With dust and lens'),
    })
    .nullable(),
  kCorrectionMag: z.number(),
  angularSizeArcsec: maybe.describe('Without the lens'),
  dimming: z
    .object({ bolometricMag: z.number(), perFrequencyMag: z.number() })
    .describe('Of surface brightness: 10 log10(1 + z) and, per unit frequency, 7.5 log10(1 + z)'),
  einsteinRadiusArcsec: maybe,
  rows: z
    .array(
      z.object({
        restA: z.number(),
        observedA: z.number(),
        throughDust: through,
        throughIgm: through,
        through,
        ab: maybe.describe('Of what was measured in a band, carried here'),
      }),
    )
    .describe('Rest wavelengths first, then observed ones, each in the order given'),
})

export const modesAnswer = z.object({
  modes: z.array(
    z.object({
      id: z.number(),
      slug: z.string(),
      name: z.string(),
      instrument: z.string(),
      telescope: z.string(),
      kind: z.enum(['imaging', 'long-slit']),
      band: z.string().nullable(),
      wavelengthMinA: z.number(),
      wavelengthMaxA: z.number(),
      medium: z.enum(['air', 'vacuum']).describe('What its wavelengths are measured in'),
      pixelScaleArcsec: z.number(),
      slitWidthArcsec: maybe,
      resolvingPower: maybe,
      minSubExposureS: z.number(),
      maxSubExposureS: z.number(),
      recordVersion: z.number(),
    }),
  ),
})

export const exposureAnswer = z.object({
  engine,
  mode: z.object({ id: z.number(), slug: z.string(), name: z.string() }),
  records: z
    .object({ site: z.number(), telescope: z.number(), mode: z.number() })
    .describe('Versions of the records computed with'),
  solve: z.enum(['snr', 'time', 'limit']),
  snr: z.number(),
  per: z.enum(['image', 'pixel', 'angstrom', 'resolution-element']),
  limit: z
    .object({ ab: maybe, fluxErgSCm2: maybe })
    .nullable()
    .describe('Faintest magnitude, or flux of a line, that reaches the S/N in the time'),
  colourMag: maybe.describe(
    'Magnitudes from the band named to where the mode works, by the spectrum; null where no band is named',
  ),
  openS: z.number().describe('Open shutter over all sub-exposures'),
  subExposures: z.number(),
  subExposureS: z.number(),
  overheadS: z.number(),
  totalS: z.number().describe('Open shutter and overheads'),
  signalE: z.number().describe('Electrons of the source in the aperture'),
  varianceE2: z
    .object({
      source: z.number(),
      sky: z.number(),
      dark: z.number(),
      read: z.number(),
      floor: z.number().describe('What is left of the sky after subtraction'),
    })
    .describe('Noise squared: electrons of each part, sky subtraction included'),
  noise: z.object({ mostly: z.enum(['source', 'sky', 'read', 'floor']), share: z.number() }),
  wavelengthA: z.number(),
  imageArcsec: z.number(),
  apertureRadiusArcsec: z.number(),
  enclosedFraction: z.number(),
  pixels: z.number(),
  skyAbArcsec2: z.number(),
  peakFraction: z.number().describe('Of what the brightest pixel holds'),
  warnings: z.array(z.string()),
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
