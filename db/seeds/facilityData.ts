/**
 * The invented observatory. Figures are plausible for their kind and consistent with one another; extinction
 * and dark sky are of the order published for good dry sites, from memory.
 */
export const site = {
  slug: 'quillon-ridge',
  name: 'Quillon Ridge Observatory',
  latitude_deg: -37.4,
  longitude_deg: -70.2,
  elevation_m: 2390,
  time_zone: 'Etc/GMT+3',
  utc_offset_hours: -3,
  lowest_altitude_deg: 20,
  extinction: { B: 0.22, g: 0.18, V: 0.13, r: 0.1, i: 0.06, z: 0.05, y: 0.05, J: 0.09, H: 0.05, K: 0.08 },
  darkSky: { B: 22.5, g: 22.1, V: 21.7, r: 21.2, i: 20.4, z: 19.3, y: 18.0, J: 16.7, H: 15.4, K: 15.0 },
  seeing: { best10: 0.6, median: 0.8, worst90: 1.3 },
  weather: {
    lostByMonth: [0.12, 0.13, 0.16, 0.22, 0.31, 0.36, 0.35, 0.31, 0.25, 0.2, 0.15, 0.12],
    persistence: 0.35,
  },
} as const

export interface SeedTelescope {
  slug: string
  name: string
  aperture_m: number
  collecting_area_m2: number
  horizon: { azimuthDeg: number; altitudeDeg: number }[]
  highest_altitude_deg: number | null
}

export const telescopes: readonly SeedTelescope[] = [
  {
    slug: 'aldous',
    name: 'Aldous',
    aperture_m: 3.8,
    collecting_area_m2: 10.2,
    horizon: [],
    highest_altitude_deg: null,
  },
  {
    slug: 'fennel',
    name: 'Fennel',
    aperture_m: 1.5,
    collecting_area_m2: 1.57,
    // It stands under the crest: the ridge in the east, and the dome of Aldous in the south-west.
    horizon: (
      [
        [0, 12],
        [45, 13],
        [70, 18],
        [95, 24],
        [115, 22],
        [140, 14],
        [200, 12],
        [222, 12],
        [226, 29],
        [236, 29],
        [240, 12],
      ] as const
    ).map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
    highest_altitude_deg: 87.5,
  },
]

export const instruments = [
  { slug: 'lantern', name: 'LANTERN', telescope: 'aldous', summary: 'optical imager' },
  { slug: 'spindle', name: 'SPINDLE', telescope: 'aldous', summary: 'optical long slit' },
  { slug: 'ember', name: 'EMBER', telescope: 'aldous', summary: 'near-infrared imager and spectrograph' },
  { slug: 'wick', name: 'WICK', telescope: 'fennel', summary: 'wide-field imager' },
] as const

export interface SeedMode {
  slug: string
  name: string
  instrument: (typeof instruments)[number]['slug']
  kind: 'imaging' | 'long-slit'
  band: string | null
  rangeA: [number, number]
  medium: 'air' | 'vacuum'
  pixelScaleArcsec: number
  dispersionAPerPixel: number | null
  slitWidthArcsec: number | null
  resolvingPower: number | null
  readNoiseE: number
  darkEPerS: number
  fullWellE: number
  gainEPerAdu: number
  subExposureS: [number, number]
  systematicFloor: number
  twilightLimitDeg: number
  skySubtraction?: 'around' | 'paired' | 'blank-sky'
  thermalEPerS?: number
  /** Of one read where not given. */
  readNoisePer?: 'read' | 'ramp'
  filters?: string
  calibrationPolicy: string
  /** Efficiency at the blue end, the middle and the red end; atmosphere is not in it. */
  efficiency: [number, number, number]
  overheads: { acquisitionS: number; readoutS: number; ditherS: number; calibrationFraction: number }
}

const optical = { medium: 'air', gainEPerAdu: 1.7, darkEPerS: 0.001, twilightLimitDeg: -18 } as const

const evenly = 'Bias and flats each evening and dawn, on the observatory’s time.'

const imager = (band: string, rangeA: [number, number], peak: number): SeedMode => ({
  ...optical,
  slug: `lantern-${band}`,
  name: `LANTERN, ${band} band`,
  instrument: 'lantern',
  kind: 'imaging',
  band,
  rangeA,
  pixelScaleArcsec: 0.25,
  dispersionAPerPixel: null,
  slitWidthArcsec: null,
  resolvingPower: null,
  readNoiseE: 4.5,
  fullWellE: 120_000,
  subExposureS: [1, 900],
  systematicFloor: 0.001,
  efficiency: [peak * 0.8, peak, peak * 0.85],
  overheads: { acquisitionS: 240, readoutS: 35, ditherS: 12, calibrationFraction: 0 },
  filters: `${band}, 90 mm, in the converging beam`,
  calibrationPolicy: evenly,
})

const slit = (arm: string, rangeA: [number, number], dispersion: number, peak: number): SeedMode => ({
  ...optical,
  slug: `spindle-${arm}`,
  name: `SPINDLE ${arm}, 1.0″ slit`,
  instrument: 'spindle',
  kind: 'long-slit',
  band: null,
  rangeA,
  pixelScaleArcsec: 0.25,
  dispersionAPerPixel: dispersion,
  slitWidthArcsec: 1,
  resolvingPower: 1400,
  readNoiseE: 3.2,
  fullWellE: 90_000,
  subExposureS: [5, 1800],
  systematicFloor: 0.01,
  efficiency: [peak * 0.55, peak, peak * 0.7],
  overheads: { acquisitionS: 600, readoutS: 48, ditherS: 0, calibrationFraction: 0.06 },
  calibrationPolicy: `${evenly} Arcs at each position and one flux standard a night, on the proposal’s time.`,
})

const infrared = (arm: string, rangeA: [number, number], dispersion: number): SeedMode => ({
  slug: `ember-${arm}`,
  name: `EMBER ${arm}, 0.8″ slit`,
  instrument: 'ember',
  kind: 'long-slit',
  band: null,
  rangeA,
  medium: 'vacuum',
  pixelScaleArcsec: 0.25,
  dispersionAPerPixel: dispersion,
  slitWidthArcsec: 0.8,
  resolvingPower: 2600,
  readNoiseE: 9,
  darkEPerS: 0.015,
  fullWellE: 100_000,
  gainEPerAdu: 2.1,
  subExposureS: [10, 600],
  // Pairs nodded along the slit leave some 0.2 % of the sky, common practice.
  systematicFloor: 0.002,
  skySubtraction: 'paired',
  thermalEPerS: 0.05,
  readNoisePer: 'ramp',
  twilightLimitDeg: -15,
  efficiency: [0.16, 0.22, 0.2],
  overheads: { acquisitionS: 800, readoutS: 9, ditherS: 14, calibrationFraction: 0.12 },
  calibrationPolicy:
    'Darks and flats each dawn, on the observatory’s time. A hot star an hour, on the proposal’s.',
})

const wide = (band: string, rangeA: [number, number], peak: number): SeedMode => ({
  ...imager(band, rangeA, peak),
  slug: `wick-${band}`,
  name: `WICK, ${band} band`,
  instrument: 'wick',
  pixelScaleArcsec: 0.45,
  readNoiseE: 6,
  fullWellE: 80_000,
  subExposureS: [1, 600],
  overheads: { acquisitionS: 180, readoutS: 28, ditherS: 10, calibrationFraction: 0 },
})

export const modes: readonly SeedMode[] = [
  imager('g', [4000, 5500], 0.46),
  imager('r', [5500, 6950], 0.52),
  imager('i', [6900, 8200], 0.48),
  imager('z', [8200, 9800], 0.3),
  slit('blue', [3600, 5900], 1.12, 0.24),
  slit('red', [5600, 9800], 2.05, 0.27),
  infrared('short', [9700, 13_600], 2.0),
  infrared('mid', [14_500, 18_000], 2.6),
  {
    ...infrared('short', [11_700, 13_300], 2.0),
    slug: 'ember-j',
    name: 'EMBER, J band',
    kind: 'imaging',
    band: 'J',
    dispersionAPerPixel: null,
    slitWidthArcsec: null,
    resolvingPower: null,
    subExposureS: [2, 60],
    systematicFloor: 0.001,
    filters: 'J, cold',
    calibrationPolicy: 'Darks and flats each dawn, on the observatory’s time.',
    efficiency: [0.32, 0.38, 0.34],
    overheads: { acquisitionS: 240, readoutS: 3, ditherS: 8, calibrationFraction: 0 },
  },
  wide('r', [5500, 6950], 0.5),
  wide('i', [6900, 8200], 0.45),
]
