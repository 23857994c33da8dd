import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { Correction } from '@/lib/domain/calls/types'
import { countInWords, formatDay } from '@/lib/format'
import { paths } from '@/lib/paths'

interface CorrectionNoteProps {
  call: { number: number; slug: string }
  /** The newest first. */
  corrections: readonly Correction[]
}

/** Over every page of a draft: the call was corrected, the newest correction in full. */
export function CorrectionNote({ call, corrections }: CorrectionNoteProps) {
  const [newest, ...earlier] = corrections
  if (!newest) return null
  return (
    <aside aria-label="Corrections of the call" className="px-gutter pt-4">
      <BarNote tone="lamp">
        <p className="m-0 max-w-prose">
          <strong className="font-semibold">
            Call {call.number} was corrected on {formatDay(newest.at)}: {newest.concerns}.
          </strong>{' '}
          {newest.body}{' '}
          <TextLink href={`${paths.call(call.slug)}#corrections`}>
            {earlier.length > 0
              ? `Read this and ${countInWords(earlier.length, 'earlier one', 'earlier ones')}`
              : 'Read it in the call'}
          </TextLink>
        </p>
      </BarNote>
    </aside>
  )
}
