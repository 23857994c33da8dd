/** A spectral line by its vacuum wavelength, angstroms. Blends carry the mean of their parts. */
export interface RestLine {
  readonly id: string
  readonly name: string
  readonly vacuumA: number
  readonly nature: 'emission' | 'absorption'
}

/**
 * Lines that redshifts are measured from. Vacuum wavelengths after Vanden Berk et al. 2001 (AJ 122, 549,
 * table 2 laboratory values), Morton 1991 for ultraviolet doublets, NIST for the near infrared.
 */
export const restLines: readonly RestLine[] = [
  { id: 'lya', name: 'Lyα', vacuumA: 1215.67, nature: 'emission' },
  { id: 'n5', name: 'N V', vacuumA: 1240.14, nature: 'emission' },
  { id: 'si4', name: 'Si IV', vacuumA: 1396.76, nature: 'emission' },
  { id: 'c4', name: 'C IV', vacuumA: 1549.06, nature: 'emission' },
  { id: 'he2-1640', name: 'He II 1640', vacuumA: 1640.42, nature: 'emission' },
  { id: 'c3', name: 'C III]', vacuumA: 1908.73, nature: 'emission' },
  { id: 'mg2', name: 'Mg II', vacuumA: 2798.75, nature: 'emission' },
  { id: 'o2', name: '[O II]', vacuumA: 3728.48, nature: 'emission' },
  { id: 'ne3', name: '[Ne III]', vacuumA: 3869.85, nature: 'emission' },
  { id: 'ca-k', name: 'Ca K', vacuumA: 3934.78, nature: 'absorption' },
  { id: 'ca-h', name: 'Ca H', vacuumA: 3969.59, nature: 'absorption' },
  { id: 'hdelta', name: 'Hδ', vacuumA: 4102.89, nature: 'emission' },
  { id: 'hgamma', name: 'Hγ', vacuumA: 4341.68, nature: 'emission' },
  { id: 'hbeta', name: 'Hβ', vacuumA: 4862.68, nature: 'emission' },
  { id: 'o3-4960', name: '[O III] 4960', vacuumA: 4960.3, nature: 'emission' },
  { id: 'o3-5008', name: '[O III] 5008', vacuumA: 5008.24, nature: 'emission' },
  { id: 'mg-b', name: 'Mg b', vacuumA: 5176.63, nature: 'absorption' },
  { id: 'na-d', name: 'Na D', vacuumA: 5895.6, nature: 'absorption' },
  { id: 'n2-6550', name: '[N II] 6550', vacuumA: 6549.85, nature: 'emission' },
  { id: 'halpha', name: 'Hα', vacuumA: 6564.61, nature: 'emission' },
  { id: 'n2-6585', name: '[N II] 6585', vacuumA: 6585.28, nature: 'emission' },
  { id: 's2-6718', name: '[S II] 6718', vacuumA: 6718.29, nature: 'emission' },
  { id: 's2-6733', name: '[S II] 6733', vacuumA: 6732.67, nature: 'emission' },
  { id: 'ca2-8500', name: 'Ca II 8500', vacuumA: 8500.36, nature: 'absorption' },
  { id: 'ca2-8544', name: 'Ca II 8544', vacuumA: 8544.44, nature: 'absorption' },
  { id: 'ca2-8665', name: 'Ca II 8665', vacuumA: 8664.52, nature: 'absorption' },
  { id: 's3-9533', name: '[S III] 9533', vacuumA: 9533.2, nature: 'emission' },
  { id: 'he1-10833', name: 'He I 10833', vacuumA: 10833.31, nature: 'emission' },
  { id: 'pa-beta', name: 'Paβ', vacuumA: 12821.58, nature: 'emission' },
  { id: 'pa-alpha', name: 'Paα', vacuumA: 18756.1, nature: 'emission' },
  { id: 'br-gamma', name: 'Brγ', vacuumA: 21661.2, nature: 'emission' },
]
