'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/Button'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { showToast } from '@/components/ui/showToast'
import type { TargetGroup } from '@/lib/domain/proposals/types'
import { unknownGroups } from '@/lib/domain/targetGroups/rules'
import { mostTargets } from '@/lib/domain/targets/rules'
import { countInWords, formatList, formatNumber, formatUtcClock } from '@/lib/format'
import { cellNames } from './cellNames'
import { ImportRows } from './ImportRows'
import type { TargetActions } from './targetActions'
import type { Import, ReadFile } from './useImport'

export interface ImportPreviewProps {
  file: ReadFile
  incoming: Import
  reference: string
  /** How many targets the proposal holds already. */
  others: number
  /** The groups it has. */
  groups: readonly TargetGroup[]
  importRows: TargetActions['importRows']
}

/** What a file holds: counts, the first thing wrong, and the rows to be looked at and mended. */
export function ImportPreview({ file, incoming, reference, others, groups, importRows }: ImportPreviewProps) {
  const [showsRows, setShowsRows] = useState(false)
  const [busy, setBusy] = useState(false)
  const count = (standing: string) => incoming.standings.filter((one) => one === standing).length
  const wrong = file.rows.filter((_, index) => incoming.standings[index] === 'wrong')
  const clashes = file.rows.filter((_, index) => incoming.standings[index] === 'clash')
  const bad = wrong.length + clashes.length
  const fresh = count('new')
  const present = file.rows.length - bad - fresh
  const isTooMany = fresh + others > mostTargets || file.rows.length > mostTargets
  const made = unknownGroups(
    groups,
    file.rows.map(({ row }) => ({ group: row.group.trim() || null })),
  )
  const taken = file.mapping.filter((column) => column !== null)
  const leftOut = file.table.columns.flatMap(({ name }, index) =>
    file.mapping[index] ? [] : name || `column ${index + 1}`,
  )

  const keep = async () => {
    setBusy(true)
    const result = await importRows({ reference, rows: file.rows.map(({ row }) => row) })
    setBusy(false)
    if (!result.ok) {
      const [field, sentence] = Object.entries(result.fieldErrors)[0] ?? []
      const at = Number(field?.split('.')[1])
      const row = Number.isInteger(at) ? file.rows[at]?.number : undefined
      return incoming.setProblem(row ? `Row ${row}: ${sentence}` : result.message)
    }
    incoming.leave()
    showToast(`${countInWords(result.data.added, 'target', 'targets', true)} added`)
  }

  return (
    <div>
      <h3 className="text-section">
        {file.name}{' '}
        <span className="text-table font-normal text-muted">
          read {formatUtcClock(file.readAt)}, not kept yet
        </span>
      </h3>
      <dl className="mt-3 grid grid-cols-[minmax(2rem,auto)_1fr] gap-x-4 gap-y-1.5 text-table">
        <dt className="text-right font-semibold">{formatNumber(file.rows.length, 0)}</dt>
        <dd className="m-0">
          {file.rows.length === 1 ? 'row' : 'rows'} read; {countInWords(taken.length, 'column')} taken
          {leftOut.length > 0 ? `, left out: ${formatList(leftOut)}` : ', none left out'}
        </dd>
        {present > 0 ? (
          <>
            <dt className="text-right font-semibold">{present}</dt>
            <dd className="m-0">here already, position, redshift and magnitude the same to the last digit</dd>
          </>
        ) : null}
        {[...wrong, ...clashes].slice(0, 4).map(({ number, row, errors }) => {
          const [cell, sentence] = Object.entries(errors)[0] ?? ['name', 'is here already with other values.']
          const key = cell as keyof typeof cellNames
          return (
            <div key={number} className="contents font-semibold text-not-feasible">
              <dt className="text-right">1</dt>
              <dd className="m-0">
                Row {number}, {cellNames[key].toLowerCase()} {row[key] || 'missing'}:{' '}
                <span className="font-normal text-ink">{sentence}</span>
              </dd>
            </div>
          )
        })}
        {bad > 4 ? (
          <>
            <dt className="text-right font-semibold">{formatNumber(bad - 4, 0)}</dt>
            <dd className="m-0">more to mend</dd>
          </>
        ) : null}
      </dl>
      {made.length > 0 ? (
        <p className="mt-3 text-table">
          {made.length === 1
            ? `The group ${made[0]} is not here yet: it is made, all of its targets wanted.`
            : `${countInWords(made.length, 'group', 'groups', true)} not here yet are made, all of their targets wanted: ${formatList(made)}.`}
        </p>
      ) : null}
      {isTooMany ? (
        <p className="mt-3 text-table font-semibold text-not-feasible">
          {`A proposal holds at most ${mostTargets} targets; with these ${formatNumber(file.rows.length, 0)} rows it would hold ${formatNumber(fresh + bad + others, 0)}.`}
        </p>
      ) : null}
      <div className="mt-4 flex flex-wrap items-center gap-4">
        {bad > 0 ? (
          <Button size="small" look="secondary" onClick={() => setShowsRows(true)}>
            {`Mend row ${[...wrong, ...clashes][0]?.number ?? ''}`}
          </Button>
        ) : isTooMany ? null : (
          <Button size="small" busy={busy} busyWord="Keeping" onClick={() => void keep()}>
            {fresh === 0 ? 'Nothing new to keep' : `Keep ${countInWords(fresh, 'target')}`}
          </Button>
        )}
        <LinkLikeButton aria-expanded={showsRows} onClick={() => setShowsRows(!showsRows)}>
          {showsRows ? 'Hide the rows' : 'See all rows'}
        </LinkLikeButton>
        <LinkLikeButton onClick={incoming.leave}>Leave it</LinkLikeButton>
      </div>
      {showsRows ? <ImportRows file={file} incoming={incoming} /> : null}
    </div>
  )
}
