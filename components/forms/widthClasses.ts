export type FieldWidth = 'short' | 'medium' | 'long' | 'full'

/** The width suits the value: a number is not asked for in a field made for a title. */
export const widthClasses: Record<FieldWidth, string> = {
  short: 'max-w-36',
  medium: 'max-w-64',
  long: 'max-w-96',
  full: 'max-w-none',
}
