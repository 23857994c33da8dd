/** A stretch of spectrum that the air dims: observed vacuum wavelengths, angstroms. */
export interface TelluricBand {
  readonly name: string
  readonly fromA: number
  readonly toA: number
}

/** Bands of oxygen and water that take a good part of the light at a mountain site. Edges to some 20 A. */
export const telluricBands: readonly TelluricBand[] = [
  { name: 'the oxygen B band', fromA: 6868, toA: 6944 },
  { name: 'a water band', fromA: 7168, toA: 7320 },
  { name: 'the oxygen A band', fromA: 7592, toA: 7700 },
  { name: 'a water band', fromA: 8130, toA: 8350 },
  { name: 'a water band', fromA: 8950, toA: 9800 },
  { name: 'a water band', fromA: 11_100, toA: 11_600 },
  { name: 'a water band', fromA: 13_480, toA: 14_950 },
  { name: 'a water band', fromA: 17_950, toA: 19_500 },
]
