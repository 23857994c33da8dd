'use client'

import { useId, useRef, useState } from 'react'
import { decodeText } from '@/components/targets/decodeText'
import { Button } from '@/components/ui/Button'
import { classNames } from '@/components/ui/classNames'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import type { TypedRow } from '@/lib/domain/facility/recordForm'
import { readTable, type TableKind, type TableRead } from '@/lib/domain/facility/rules'
import { TablePreview } from './TablePreview'

const largestBytes = 2_000_000

const expected: Record<TableKind, string> = {
  throughput: 'wavelength, with its unit (Å, nm or µm), and efficiency',
  extinction: 'band and extinction',
  'dark-sky': 'band and sky',
  horizon: 'azimuth, from north through east, and lowest altitude, both in degrees',
}

export interface TableIntakeProps {
  kind: TableKind
  before: readonly TypedRow[]
  onTake: (rows: TypedRow[]) => void
  onLeave: () => void
}

/** A file chosen or dropped, or rows pasted: read, drawn and looked at before they replace what is in the form. */
export function TableIntake({ kind, before, onTake, onLeave }: TableIntakeProps) {
  const id = useId()
  const chooser = useRef<HTMLInputElement>(null)
  const [isOver, setOver] = useState(false)
  const [pasted, setPasted] = useState('')
  const [incoming, setIncoming] = useState<{ name: string; read: TableRead } | null>(null)

  const refuse = (name: string, message: string) => setIncoming({ name, read: { ok: false, message } })
  const take = async (file: File | undefined) => {
    if (!file) return
    if (file.size === 0) refuse(file.name, 'It is empty.')
    else if (file.size > largestBytes) refuse(file.name, 'It is larger than 2 MB.')
    else setIncoming({ name: file.name, read: readTable(decodeText(await file.arrayBuffer()), kind) })
  }
  const readPasted = () => setIncoming({ name: 'Pasted rows', read: readTable(pasted, kind) })

  return (
    <div className="mt-4 rounded border border-rule p-5 max-sm:p-4">
      <p className="m-0 text-table text-muted">
        The first line names the columns: {expected[kind]}. Commas, semicolons or tabs part them; a decimal
        comma is read beside semicolons only. You see every row before it is taken.
      </p>
      <div
        className={classNames(
          'mt-3 flex flex-wrap items-center gap-4 rounded border border-dashed p-3',
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
          void take(event.dataTransfer.files[0])
        }}
      >
        <span className="text-table text-muted max-sm:hidden">Drop here</span>
        <input
          ref={chooser}
          type="file"
          accept=".csv,.tsv,.txt,.dat,text/*"
          className="sr-only"
          aria-label="File of the table"
          tabIndex={-1}
          onChange={(event) => {
            void take(event.target.files?.[0])
            event.target.value = ''
          }}
        />
        <Button size="small" look="secondary" onClick={() => chooser.current?.click()}>
          Choose a file
        </Button>
      </div>
      <label htmlFor={`${id}-paste`} className="mt-4 block text-table font-semibold">
        Or paste rows
      </label>
      <textarea
        id={`${id}-paste`}
        rows={4}
        value={pasted}
        spellCheck={false}
        onChange={(event) => setPasted(event.target.value)}
        className="mt-1 block w-full rounded border border-edge bg-surface p-3 text-table text-ink"
      />
      <div className="mt-3 flex flex-wrap items-center gap-4">
        <Button size="small" look="secondary" onClick={readPasted}>
          Read these rows
        </Button>
        <LinkLikeButton onClick={onLeave}>Leave it</LinkLikeButton>
      </div>
      {incoming && !incoming.read.ok ? (
        <p role="alert" className="mt-4 text-table font-semibold text-not-feasible">
          {incoming.name}: {incoming.read.message}
        </p>
      ) : null}
      {incoming?.read.ok ? (
        <TablePreview
          name={incoming.name}
          read={incoming.read}
          kind={kind}
          before={before}
          onTake={onTake}
          onLeave={() => setIncoming(null)}
        />
      ) : null}
    </div>
  )
}
