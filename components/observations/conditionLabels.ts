/** What each field of the conditions is called. */
export const conditionLabels = {
  name: 'Name',
  maxAirmass: 'Highest airmass',
  imageQuality: 'Poorest image',
  moon: 'Brightest Moon',
  minMoonSeparation: 'Nearest Moon',
  transparency: 'Poorest sky',
  dateFrom: 'Not before the evening of',
  dateTo: 'Not after the evening of',
  cadence: 'How often',
}
