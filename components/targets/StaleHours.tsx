export interface StaleHoursProps {
  theirs: string
  yours: string
  onTake: (hours: string) => void
}

/** Someone else asked for other hours first: one of the two is chosen, and neither is kept before. */
export function StaleHours({ theirs, yours, onTake }: StaleHoursProps) {
  const choice = (words: string, hours: string) => (
    <button
      type="button"
      className="block w-full text-right text-tick text-accent underline underline-offset-2 max-sm:min-h-9 max-sm:text-left"
      onClick={() => onTake(hours)}
    >
      {words}, {hours}
    </button>
  )
  return (
    <>
      {choice('theirs', theirs)}
      {choice('yours', yours)}
    </>
  )
}
