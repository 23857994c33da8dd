/** Proposals whose rank differs between two orders, in the newer order; none when there is no older one. */
export function changesBetween(
  before: readonly number[],
  after: readonly number[],
  numberOf: ReadonlyMap<number, string>,
): { reviewNumber: string; from: number; to: number }[] {
  return after.flatMap((id, index) => {
    const from = before.indexOf(id) + 1
    return from === 0 || from === index + 1
      ? []
      : [{ reviewNumber: numberOf.get(id) ?? '', from, to: index + 1 }]
  })
}
