import type { SheetColumn } from './sheet'

/** The first column of most sheets. Redshifts stand as they were given, with the digits of the longest. */
export function redshiftColumn(redshifts: readonly number[]): SheetColumn {
  const digits = redshifts.map((z) => {
    const [mantissa = '', power] = String(z).split('e')
    return power ? 6 : (mantissa.split('.')[1]?.length ?? 0)
  })
  const decimals = Math.min(
    6,
    digits.reduce((most, one) => Math.max(most, one), 0),
  )
  return {
    id: 'z',
    head: 'z',
    fileUnit: '',
    description: 'redshift',
    latex: 'z',
    decimals,
    place: null,
    given: true,
  }
}
