import { BarNote } from '@/components/ui/BarNote'
import type { PaperRepair } from '@/lib/domain/papers/repairTypes'
import { formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'
import { PaperUpload } from './PaperUpload'

interface ReplacePaperProps {
  reference: string
  repair: PaperRepair
}

/** A paper of a sent proposal that the office has opened: why, until when, and the place for the right file. */
export function ReplacePaper({ reference, repair }: ReplacePaperProps) {
  const what = repair.kind === 'justification' ? 'justification' : 'document on the team'
  return (
    <section className="mb-10">
      <BarNote tone="lamp">
        <p className="m-0">
          The office has opened the {what} for one replacement, until {formatUtcInstant(repair.openUntil)}:{' '}
          {repair.reason}
        </p>
        <p className="mt-1 text-muted">
          Everything else stays as it was sent. Both files are kept, and the panel reads the new one.
        </p>
      </BarNote>
      <div className="mt-4">
        <PaperUpload
          to={paths.paperReplacement(reference)}
          kind={repair.kind}
          label={`The right ${what}`}
          help="A PDF of at most 20 MB. It becomes a new version at once, and cannot be replaced again."
        />
      </div>
    </section>
  )
}
