/** A quantity's letter with what stands below it: D with L. */
export function HeadOf({ head, below }: { head: string; below?: string }) {
  return below ? (
    <>
      {head}
      <sub>{below}</sub>
    </>
  ) : (
    head
  )
}
