/** An IBAN as it is printed, in groups of four (ISO 13616). */
export const formatAccount = (iban: string): string => iban.replace(/(.{4})(?=.)/g, '$1 ')
