/** Classes of institutes as they are called on screen. */
export const affiliationWords = {
  member: 'member institute',
  partner: 'partner institute',
  other: 'other institute',
} as const
