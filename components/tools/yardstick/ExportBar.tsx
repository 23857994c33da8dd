'use client'

import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import { saveText } from '@/components/tables/saveText'
import { citationLine } from '@/lib/domain/tools/yardstick/exports/citation'
import { sheetCsv } from '@/lib/domain/tools/yardstick/exports/csv'
import { sheetEcsv } from '@/lib/domain/tools/yardstick/exports/ecsv'
import { sheetLatex } from '@/lib/domain/tools/yardstick/exports/latex'
import { sheetPlain } from '@/lib/domain/tools/yardstick/exports/plain'
import type { Sheet } from '@/lib/domain/tools/yardstick/sheets/sheet'
import type { ReadyUniverse } from '@/lib/domain/tools/yardstick/universes'
import { countInWords } from '@/lib/format'

export interface ExportBarProps {
  /** What is shown, in the order it is shown. Asked only when a file is. */
  sheet: () => Sheet
  universes: readonly ReadyUniverse[]
  /** False when the list is too long for an address. */
  linkable: boolean
}

const formats = [
  { name: 'text', ending: 'txt', type: 'text/plain;charset=utf-8' },
  { name: 'CSV', ending: 'csv', type: 'text/csv;charset=utf-8' },
  { name: 'ECSV', ending: 'ecsv', type: 'text/plain;charset=utf-8' },
  { name: 'LaTeX', ending: 'tex', type: 'application/x-tex' },
] as const

type Format = (typeof formats)[number]

async function copy(text: string, done: string): Promise<void> {
  try {
    await navigator.clipboard.writeText(text)
    showToast(done)
  } catch {
    showToast('The browser does not allow copying here. Save the file instead.')
  }
}

/** The table as text, CSV, ECSV or LaTeX, to copy or to save; the link that brings it back, and how to cite it. */
export function ExportBar({ sheet, universes, linkable }: ExportBarProps) {
  const write = ({ name }: Format): string => {
    const made = sheet()
    if (name === 'CSV') return sheetCsv(made)
    if (name === 'ECSV') return sheetEcsv(made, universes, window.location.href)
    const citation = citationLine(universes)
    return name === 'LaTeX' ? sheetLatex(made, universes, citation) : sheetPlain(made, universes, citation)
  }
  const words = (format: Format) => `${countInWords(sheet().rows.length, 'row')} as ${format.name}`
  return (
    <>
      <span className="flex flex-wrap items-baseline gap-x-3">
        Copy
        {formats.map((format) => (
          <LinkLikeButton
            key={format.name}
            aria-label={`Copy as ${format.name}`}
            onClick={() => void copy(write(format), `Copied ${words(format)}.`)}
          >
            {format.name}
          </LinkLikeButton>
        ))}
      </span>
      <span className="flex flex-wrap items-baseline gap-x-3">
        Save
        {formats.map((format) => (
          <LinkLikeButton
            key={format.name}
            aria-label={`Save as ${format.name}`}
            onClick={() => saveText(`yardstick.${format.ending}`, write(format), format.type)}
          >
            {format.name}
          </LinkLikeButton>
        ))}
      </span>
      {linkable ? (
        <LinkLikeButton onClick={() => void copy(window.location.href, 'Copied the link to this page.')}>
          Link
        </LinkLikeButton>
      ) : (
        <span>too long for a link</span>
      )}
    </>
  )
}
