import { BarNote } from '@/components/ui/BarNote'
import { formatNumber } from '@/lib/format'
import type { Citations } from '@/lib/writing/citations'
import { referenceLine } from '@/lib/writing/referenceLine'
import type { ReferenceList } from '@/lib/writing/references'

export interface ReferencesReadProps extends ReferenceList {
  citations: Pick<Citations, 'numbers' | 'unknown'>
}

/** What was read of the entries: those that are cited by number, and what is wrong by line. */
export function ReferencesRead({ references, problems, citations }: ReferencesReadProps) {
  const { numbers, unknown } = citations
  return (
    <>
      {problems.length > 0 || unknown.length > 0 ? (
        <BarNote tone="lamp">
          <ul className="m-0 pl-5">
            {problems.map(({ line, sentence }) => (
              <li key={`${line} ${sentence}`} className="[overflow-wrap:anywhere]">
                Line {formatNumber(line)}: {sentence}
              </li>
            ))}
            {unknown.map(({ key, line }) => (
              <li key={`${key} ${line}`} className="[overflow-wrap:anywhere]">
                Line {formatNumber(line)} of the text cites {key}, which no entry has.
              </li>
            ))}
          </ul>
        </BarNote>
      ) : null}
      {references.length > 0 ? (
        <ol className="plain-list mt-4 text-table">
          {references.map((reference) => (
            <li
              key={reference.key}
              className="grid grid-cols-[5rem_minmax(0,1fr)] gap-x-3 border-t border-rule py-2"
            >
              <span className="text-muted">
                {numbers.has(reference.key) ? `[${numbers.get(reference.key) ?? ''}]` : 'not cited'}
              </span>
              <span className="[overflow-wrap:anywhere]">
                {referenceLine(reference)} <code className="text-muted">[@{reference.key}]</code>
              </span>
            </li>
          ))}
        </ol>
      ) : (
        <p className="mt-4 text-table text-muted">No entries yet.</p>
      )}
    </>
  )
}
