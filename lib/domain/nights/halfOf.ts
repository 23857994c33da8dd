/** Half-months since the year 0: two a month, the second from the 16th on. */
export const halfOf = (date: string): number =>
  2 * (12 * Number(date.slice(0, 4)) + Number(date.slice(5, 7)) - 1) +
  (Number(date.slice(8, 10)) < 16 ? 0 : 1)
