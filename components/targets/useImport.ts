'use client'

import { useState } from 'react'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import {
  nameKey,
  readTargetFile,
  rowErrors,
  saysTheSame,
  type ImportedRow,
  type TargetFile,
} from '@/lib/domain/targets/rules'
import { targetRowSchema, type TargetRow } from '@/lib/domain/targets/schema'

const largestBytes = 2_000_000

export interface ReadFile {
  name: string
  readAt: Date
  recognised: string[]
  ignored: string[]
  rows: ImportedRow[]
}

/** Whether a row says what a target here says already, or clashes with one. */
export function standingOf(row: ImportedRow, targets: readonly Target[]): 'new' | 'same' | 'clash' | 'wrong' {
  const parsed = targetRowSchema.safeParse(row.row)
  if (!parsed.success) return 'wrong'
  const known = targets.find(({ name }) => nameKey(name) === nameKey(parsed.data.name))
  if (!known) return 'new'
  return saysTheSame(known, parsed.data) ? 'same' : 'clash'
}

function decode(bytes: ArrayBuffer): string {
  const start = new Uint8Array(bytes.slice(0, 2))
  const isWide = (start[0] === 0xff && start[1] === 0xfe) || (start[0] === 0xfe && start[1] === 0xff)
  if (isWide) return new TextDecoder(start[0] === 0xff ? 'utf-16le' : 'utf-16be').decode(bytes)
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    return new TextDecoder('windows-1252').decode(bytes)
  }
}

/** A file or a pasted table on its way in: read, shown row by row, mended here, kept whole or left. */
export function useImport(contents: ProposalContents) {
  const [file, setFile] = useState<ReadFile | null>(null)
  const [problem, setProblem] = useState<string | null>(null)

  const take = (name: string, read: TargetFile) => {
    if (!read.ok) {
      setProblem(`${name}: ${read.message}`)
      return
    }
    setProblem(null)
    setFile({ name, readAt: new Date(), ...read, recognised: [...new Set(read.recognised)] })
  }

  const change = (number: number, cell: keyof TargetRow, text: string) =>
    setFile((before) =>
      before
        ? {
            ...before,
            rows: before.rows.map((one) => {
              if (one.number !== number) return one
              const row = { ...one.row, [cell]: text }
              return { ...one, row, errors: rowErrors(row) }
            }),
          }
        : before,
    )

  return {
    file,
    problem,
    standings: (file?.rows ?? []).map((row) => standingOf(row, contents.targets)),
    change,
    readText: (name: string, text: string) => take(name, readTargetFile(text)),
    readUpload: async (upload: File) => {
      if (upload.size === 0) setProblem(`${upload.name} is empty.`)
      else if (upload.size > largestBytes) setProblem(`${upload.name} is larger than 2 MB.`)
      else take(upload.name, readTargetFile(decode(await upload.arrayBuffer())))
    },
    leaveOut: (number: number) =>
      setFile((before) =>
        before ? { ...before, rows: before.rows.filter((row) => row.number !== number) } : before,
      ),
    leave: () => {
      setFile(null)
      setProblem(null)
    },
    setProblem,
  }
}

export type Import = ReturnType<typeof useImport>
