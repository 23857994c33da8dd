import { z } from 'zod'

/** ISO 7064 MOD 11-2, as ORCID iDs end. */
function orcidChecks(digits: string): boolean {
  let total = 0
  for (const digit of digits.slice(0, 15)) total = (total + Number(digit)) * 2
  const check = (12 - (total % 11)) % 11
  return digits[15] === (check === 10 ? 'X' : String(check))
}

/** An ORCID iD, with or without hyphens or the address in front; '' for none. */
export const orcid = z
  .string()
  .trim()
  .transform((text) =>
    text
      .replace(/^https?:\/\/orcid\.org\//i, '')
      .replaceAll('-', '')
      .toUpperCase(),
  )
  .refine(
    (digits) => digits === '' || /^\d{15}[\dX]$/.test(digits),
    'An ORCID iD has sixteen digits: 0000-0000-0000-0000.',
  )
  .refine(
    (digits) => !/^\d{15}[\dX]$/.test(digits) || orcidChecks(digits),
    'The last digit does not fit the others; look for a slip in this iD.',
  )
  .transform((digits) => (digits ? (digits.match(/.{4}/g) ?? []).join('-') : ''))
