export interface CallExampleProps {
  summary: string
  /** As typed in a shell. */
  call: string
}

/** What a calculation is for, and a call of it to copy. */
export function CallExample({ summary, call }: CallExampleProps) {
  return (
    <div className="mb-6 last:mb-0">
      <p className="max-w-prose text-table text-muted">{summary}.</p>
      <pre className="mt-2 border-l-2 border-rule py-1 pl-4 font-sans text-table break-words whitespace-pre-wrap tabular-nums">
        <code className="font-sans">{call}</code>
      </pre>
    </div>
  )
}
