/** What is wrong with a BIC, in a sentence; null when nothing is. ISO 9362: 4 characters, 2 letters, 2, perhaps 3. */
export const bankProblem = (bic: string): string | null =>
  /^[A-Z0-9]{4}[A-Z]{2}[A-Z0-9]{2}([A-Z0-9]{3})?$/.test(bic)
    ? null
    : 'A BIC has 8 or 11 characters; the fifth and the sixth are the letters of the country.'
