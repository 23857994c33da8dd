import { TextLink } from '@/components/ui/TextLink'
import type { History } from '@/lib/domain/proposals/history/readHistory'
import { formatUtcInstant } from '@/lib/format'
import { paths } from '@/lib/paths'

/** Versions that were sent, newest first; the one that stands is named so. */
export function SentVersions({ versions, reference }: Pick<History, 'versions'> & { reference: string }) {
  if (versions.length === 0)
    return (
      <p className="mt-3 text-muted">
        Nothing has been sent yet. Each sending is kept here, and none is ever lost.
      </p>
    )
  return (
    <ol className="plain-list mt-2 text-table">
      {versions.map((version) => (
        <li key={version.number} className="border-t border-rule py-3">
          <strong className="font-semibold">
            Version {version.number}
            {version.stands ? ', stands' : ''}
          </strong>
          <div>
            Arrived {formatUtcInstant(version.arrivedAt)}, sent by {version.sentBy}
          </div>
          <div>
            <TextLink href={paths.proposalHistory(reference, version.number)}>
              How it went on<span className="sr-only"> after version {version.number}</span>
            </TextLink>
          </div>
          <div className="[overflow-wrap:anywhere] text-muted">
            Fingerprint {version.sha256.slice(0, 16)}, computed with {version.engineVersion}
          </div>
        </li>
      ))}
    </ol>
  )
}
