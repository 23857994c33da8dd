import { classNames } from '@/components/ui/classNames'
import { countInWords, formatNumber } from '@/lib/format'

export interface WordCountProps {
  words: number
  limit: number
}

/** Words of a text as they are typed, against how many it may have. More are kept, and cannot be sent. */
export function WordCount({ words, limit }: WordCountProps) {
  const over = words - limit
  return (
    <p
      className={classNames(
        'm-0 mt-1 text-right text-caption',
        over > 0 ? 'font-semibold text-not-feasible' : 'text-muted',
      )}
    >
      {formatNumber(words)} of {formatNumber(limit)} words
      {over > 0 ? `; ${countInWords(over, 'word')} too many to be sent` : ''}
    </p>
  )
}
