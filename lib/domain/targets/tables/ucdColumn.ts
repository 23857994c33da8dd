import type { TargetColumn } from '../targetColumn'

/** What UCDs mean for a target: UCD1+ words (IVOA list 1.5), then those of the first UCDs that VOTable 1.1 files carry. */
const meanings: readonly (readonly [RegExp, TargetColumn])[] = [
  [/^meta\.id;meta\.main$|^id_main$/, 'name'],
  [/^pos\.eq\.ra(;meta\.main)?$|^pos_eq_ra(_main)?$/, 'ra'],
  [/^pos\.eq\.dec(;meta\.main)?$|^pos_eq_dec(_main)?$/, 'dec'],
  [/^pos\.pm;pos\.eq\.ra|^pos_eq_pmra$/, 'pmRa'],
  [/^pos\.pm;pos\.eq\.dec|^pos_eq_pmdec$/, 'pmDec'],
  [/^src\.redshift(\.phot)?(;meta\.main)?$|^redshift(_hc|_phot)?$/, 'redshift'],
  [/^stat\.error;src\.redshift/, 'redshiftError'],
  [/^phot\.mag;em\.(opt\.[ubvri]|ir\.[jhk])\b|^phot_(jhn|sdss)_[ubvrijhkg]$/, 'magnitude'],
  [/^stat\.error;phot\.mag/, 'magnitudeError'],
  [/^stat\.error;phys\.angsize/, 'effectiveRadiusError'],
  [/^phot\.color\.excess$/, 'ebv'],
  [/^phot\.flux;spect\.line|^spect\.line\.intensity$/, 'lineFlux'],
  [/^stat\.error;(phot\.flux;spect\.line|spect\.line\.intensity)/, 'lineFluxError'],
  [/^phys\.luminosity;spect\.line/, 'lineLuminosity'],
  [/^stat\.error;phys\.luminosity;spect\.line/, 'lineLuminosityError'],
  [/^spect\.line\.width$/, 'lineWidth'],
  [/^meta\.id;spect\.line$/, 'lineName'],
  [/^meta\.(ref|bib(\.bibcode)?);phot\.mag/, 'source'],
]

/** What a column is by its UCD; null where that says nothing a target has. */
export function ucdColumn(ucd: string): TargetColumn | null {
  const words = ucd.toLowerCase().replace(/\s/g, '')
  return meanings.find(([pattern]) => pattern.test(words))?.[1] ?? null
}
