'use client'

import { useMemo, useState } from 'react'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import {
  longestText,
  mendRow,
  readTargetFile,
  rowsOf,
  takeColumn,
  type ImportedRow,
  type Mapping,
  type Table,
  type TargetColumn,
  type TargetFile,
} from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { decodeText } from './decodeText'
import { standingsOf } from './standingsOf'

interface OpenFile {
  name: string
  readAt: Date
  table: Table
  mapping: Mapping
  /** Cells typed anew, by row. */
  mended: ReadonlyMap<number, Partial<TargetRow>>
  leftOut: ReadonlySet<number>
}

export interface ReadFile extends OpenFile {
  rows: readonly ImportedRow[]
}

const noRows: readonly ImportedRow[] = []

/** A file or a pasted table on its way in: its columns told, shown row by row, mended here, kept whole or left. */
export function useImport(contents: ProposalContents) {
  const [open, setOpen] = useState<OpenFile | null>(null)
  const [problem, setProblem] = useState<string | null>(null)
  const change = (by: (before: OpenFile) => Partial<OpenFile>) =>
    setOpen((before) => (before ? { ...before, ...by(before) } : before))

  const { table, mapping, mended, leftOut } = open ?? {}
  const read = useMemo(() => (table && mapping ? rowsOf(table, mapping) : noRows), [table, mapping])
  const rows = useMemo(
    () =>
      read
        .filter(({ number }) => !leftOut?.has(number))
        .map((row) => {
          const typed = mended?.get(row.number)
          return typed ? mendRow(row, typed) : row
        }),
    [read, mended, leftOut],
  )
  const standings = useMemo(() => standingsOf(rows, contents.targets), [rows, contents.targets])

  const take = (name: string, file: TargetFile) => {
    if (!file.ok) return setProblem(`${name}: ${file.message}`)
    setProblem(null)
    setOpen({
      ...{ name, readAt: new Date(), table: file.table, mapping: file.mapping },
      ...{ mended: new Map(), leftOut: new Set() },
    })
  }

  return {
    file: open ? { ...open, rows } : null,
    problem,
    standings,
    takeAs: (index: number, column: TargetColumn | null) =>
      change((before) => ({ mapping: takeColumn(before.mapping, index, column) })),
    change: (number: number, cell: keyof TargetRow, text: string) =>
      change((before) => ({
        mended: new Map(before.mended).set(number, { ...before.mended.get(number), [cell]: text }),
      })),
    readText: (name: string, text: string) => take(name, readTargetFile(text)),
    readUpload: async (upload: File) => {
      if (upload.size === 0) setProblem(`${upload.name} is empty.`)
      else if (upload.size > longestText) setProblem(`${upload.name} is larger than 5 MB.`)
      else take(upload.name, readTargetFile(decodeText(await upload.arrayBuffer())))
    },
    leaveOut: (number: number) => change((before) => ({ leftOut: new Set(before.leftOut).add(number) })),
    leave: () => {
      setOpen(null)
      setProblem(null)
    },
    setProblem,
  }
}

export type Import = ReturnType<typeof useImport>
