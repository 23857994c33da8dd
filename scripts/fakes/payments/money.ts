const currenciesWithoutMinorUnits = new Set([
  'jpy',
  'krw',
  'clp',
  'vnd',
  'isk',
  'ugx',
  'xaf',
  'xof',
  'pyg',
  'rwf',
])

/** An amount in the currency's smallest unit, as people write it. */
export function money(amount: number, currency: string): string {
  const digits = currenciesWithoutMinorUnits.has(currency) ? 0 : 2
  const value = (amount / 10 ** digits).toLocaleString('en-GB', {
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  })
  return `${currency.toUpperCase()} ${value}`
}
