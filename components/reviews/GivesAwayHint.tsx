import { givesAway } from '@/lib/domain/reviews/giveawayWords'
import { formatList } from '@/lib/format'

/** A quiet word when a text may tell the investigators who wrote it. */
export function GivesAwayHint({ body }: { body: string }) {
  const found = givesAway(body)
  if (found.length === 0) return null
  return (
    <p role="status" className="mt-1 border-l-4 border-lamp pl-3 text-caption">
      {formatList(found.map((words) => `“${words}”`))} may tell the investigators who you are.
    </p>
  )
}
