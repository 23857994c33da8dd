'use client'

import { useId, useRef, useState } from 'react'
import { Button } from '@/components/ui/Button'
import { classNames } from '@/components/ui/classNames'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { ImportColumns } from './ImportColumns'
import { ImportPreview } from './ImportPreview'
import type { TargetActions } from './targetActions'
import { useImport } from './useImport'

export interface ImportPanelProps {
  contents: ProposalContents
  importRows: TargetActions['importRows']
}

/** Where a table is pasted or a file dropped; every row is shown before anything is kept. */
export function ImportPanel({ contents, importRows }: ImportPanelProps) {
  const id = useId()
  const chooser = useRef<HTMLInputElement>(null)
  const incoming = useImport(contents)
  const [isOver, setOver] = useState(false)
  const [pasting, setPasting] = useState<string | null>(null)

  const readPasted = (text: string) => {
    incoming.readText('Pasted rows', text)
    setPasting(null)
  }
  const paste = async () => {
    try {
      const text = await navigator.clipboard.readText()
      if (text.trim()) return readPasted(text)
    } catch {
      // The browser may not let a page read the clipboard: then one pastes into a field.
    }
    setPasting('')
  }

  return (
    <section
      aria-labelledby={id}
      className="grid rounded border border-rule bg-surface lg:grid-cols-2 lg:divide-x lg:divide-rule"
    >
      <div className="p-6 max-sm:p-4">
        <h2 id={id} className="text-section">
          Paste rows, or drop a file
        </h2>
        <p className="text-table text-muted">
          CSV, ECSV or VOTable, columns in any order, told by name, UCD and unit: name, ra, dec, z, mag, band.
          You see every column and row before anything is kept.
        </p>
        <div
          className={classNames(
            'mt-4 flex min-h-19 flex-wrap items-center justify-center gap-4 rounded border border-dashed p-3',
            isOver ? 'border-lamp bg-lamp-wash' : 'border-edge',
          )}
          onDragOver={(event) => {
            event.preventDefault()
            setOver(true)
          }}
          onDragLeave={() => setOver(false)}
          onDrop={(event) => {
            event.preventDefault()
            setOver(false)
            const [dropped] = event.dataTransfer.files
            if (dropped) void incoming.readUpload(dropped)
            else readPasted(event.dataTransfer.getData('text'))
          }}
        >
          <span className="text-table text-muted max-sm:hidden">Drop here</span>
          <input
            ref={chooser}
            type="file"
            accept=".csv,.tsv,.txt,.ecsv,.dat,.xml,.vot,.votable,text/*,application/x-votable+xml"
            className="sr-only"
            aria-label="File of targets"
            tabIndex={-1}
            onChange={(event) => {
              const [chosen] = event.target.files ?? []
              if (chosen) void incoming.readUpload(chosen)
              event.target.value = ''
            }}
          />
          <Button size="small" look="secondary" onClick={() => chooser.current?.click()}>
            Choose a file
          </Button>
          <Button size="small" look="secondary" onClick={() => void paste()}>
            Paste
          </Button>
        </div>
        {pasting !== null ? (
          <div className="mt-4">
            <label htmlFor={`${id}-paste`} className="text-table font-semibold">
              Rows, the first of them naming the columns
            </label>
            <textarea
              id={`${id}-paste`}
              rows={6}
              autoFocus
              value={pasting}
              spellCheck={false}
              onChange={(event) => setPasting(event.target.value)}
              className="mt-1 block w-full rounded border border-edge bg-surface p-3 text-table"
            />
            <span className="mt-3 flex gap-3">
              <Button size="small" look="secondary" onClick={() => readPasted(pasting)}>
                Read these rows
              </Button>
              <Button size="small" look="secondary" onClick={() => setPasting(null)}>
                Leave it
              </Button>
            </span>
          </div>
        ) : null}
        {incoming.problem ? (
          <p role="alert" className="mt-3 text-table font-semibold text-not-feasible">
            {incoming.problem}
          </p>
        ) : null}
        {incoming.file ? <ImportColumns file={incoming.file} incoming={incoming} /> : null}
      </div>
      <div className="p-6 max-lg:border-t max-lg:border-rule max-sm:p-4">
        {incoming.file ? (
          <ImportPreview
            file={incoming.file}
            incoming={incoming}
            reference={contents.reference}
            others={contents.targets.length}
            groups={contents.groups}
            importRows={importRows}
          />
        ) : (
          <p className="m-0 text-table text-muted">
            The rows of a file stand here first, each with what was understood. Nothing is kept until all of
            them are right.
          </p>
        )}
      </div>
    </section>
  )
}
