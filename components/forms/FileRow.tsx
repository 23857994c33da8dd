import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { ProgressBar } from '@/components/ui/ProgressBar'
import { formatBytes } from '@/lib/format'

export interface FileSending {
  /** From 0 to 1. */
  share: number
  /** What is being done: `3.2 MB of 12.4 MB sent`. */
  words: string
  onStop?: () => void
}

/** The chosen file with its size and, while it is on its way, how far it has got. */
export function FileRow({ file, sending }: { file: File; sending: FileSending | null }) {
  return (
    <div className="text-table">
      <p className="m-0">
        <strong className="font-semibold">{file.name}</strong>{' '}
        <span className="text-muted">{formatBytes(file.size)}</span>
      </p>
      {sending ? (
        <div className="mt-1.5">
          <ProgressBar share={sending.share} label={`Sending ${file.name}`} valueText={sending.words} />
          <p className="m-0 mt-1.5 flex items-center gap-3">
            <span>{sending.words}</span>
            {sending.onStop ? (
              <LinkLikeButton onClick={sending.onStop} aria-label={`Stop sending ${file.name}`}>
                Stop
              </LinkLikeButton>
            ) : null}
          </p>
        </div>
      ) : null}
    </div>
  )
}
