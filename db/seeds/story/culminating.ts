/** Hours of right ascension that culminate in the dark of a season beginning in this month. */
export function culminating(seasonFrom: string): [number, number] {
  const month = Number(seasonFrom.slice(5, 7)) - 1
  const middle = (6.6 + 2 * month + 6) % 24
  return [middle - 4, middle + 4]
}
