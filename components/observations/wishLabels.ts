/** What the fields of a wish are called. */
export const wishLabels = {
  least: 'Least of use, h',
  service: 'Who observes',
  nights: 'Nights of the visit',
  part: 'Of each night',
  together: 'In a row',
} as const
