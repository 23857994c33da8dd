'use client'

import { useId, useRef, useState } from 'react'
import { useFormContext, useWatch } from 'react-hook-form'
import { LineChart } from '@/components/charts/LineChart'
import { Button } from '@/components/ui/Button'
import { formatNumber } from '@/lib/format'
import { readSpectrumTable, spectrumText, type SpectrumTable } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { decodeText } from './decodeText'

/** Far more than the rows that are kept need. */
const mostBytes = 500_000

function Preview({ table, name }: { table: SpectrumTable; name: string }) {
  const { wavelengthsNm, fLambda } = table
  const peak = Math.max(...fLambda)
  const points = wavelengthsNm.map((at, index): [number, number] => [at, (fLambda[index] ?? 0) / peak])
  const [from, to] = [wavelengthsNm[0], wavelengthsNm.at(-1)]
  const words = `${name}: ${formatNumber(points.length, 0)} rows, ${formatNumber(from, 1)} to ${formatNumber(to, 1)} nm.`
  return (
    <figure className="m-0">
      <figcaption className="text-caption text-muted">{words}</figcaption>
      <LineChart
        fluid
        label={words}
        series={[{ id: 'spectrum', name: 'f_λ', tone: 's1', points, chosen: true }]}
        labels="inside"
        height={180}
        xLabel="wavelength at rest, nm"
      />
    </figure>
  )
}

/** The table of a spectrum: a file is read and shown before it is kept. */
export function SpectrumFile({ readOnly, onSave }: { readOnly: string | null; onSave: () => void }) {
  const id = useId()
  const chooser = useRef<HTMLInputElement>(null)
  const { control, setValue } = useFormContext<TargetRow>()
  const kept = useWatch({ control, name: 'spectrumTable' })
  const [read, setRead] = useState<{ name: string; table: SpectrumTable } | null>(null)
  const [problem, setProblem] = useState<string | null>(null)

  const take = async (file: File) => {
    setRead(null)
    setProblem(null)
    if (file.size > mostBytes) return setProblem('A spectrum is smaller than 0.5 MB.')
    const reading = readSpectrumTable(decodeText(await file.arrayBuffer()))
    if (reading.ok) setRead({ name: file.name, table: reading.value })
    else setProblem(reading.message)
  }
  const keep = (table: SpectrumTable) => {
    setValue('spectrumTable', spectrumText(table), { shouldDirty: true, shouldTouch: true })
    setRead(null)
    onSave()
  }
  const standing = kept === '' ? null : readSpectrumTable(kept)
  return (
    <div className="sm:col-span-2">
      {readOnly ? null : (
        <>
          <p id={id} className="m-0 pb-2 text-caption text-muted">
            CSV with two columns: wavelength in nm, at rest and in vacuum, and f_λ in any unit; 400 rows at
            most.
          </p>
          <input
            ref={chooser}
            type="file"
            accept=".csv,.tsv,.txt,.dat,text/*"
            className="sr-only"
            aria-label="File of the spectrum"
            tabIndex={-1}
            onChange={(event) => {
              const [chosen] = event.target.files ?? []
              if (chosen) void take(chosen)
              event.target.value = ''
            }}
          />
          <Button
            size="small"
            look="secondary"
            aria-describedby={id}
            onClick={() => chooser.current?.click()}
          >
            {standing ? 'Choose another file' : 'Choose a file'}
          </Button>
        </>
      )}
      {problem ? (
        <p role="alert" className="m-0 pt-2 text-table font-semibold text-not-feasible">
          {problem}
        </p>
      ) : null}
      {read ? (
        <div className="pt-3">
          <Preview name={read.name} table={read.table} />
          <span className="mt-2 flex gap-3">
            <Button size="small" look="secondary" onClick={() => keep(read.table)}>
              Keep this spectrum
            </Button>
            <Button size="small" look="secondary" onClick={() => setRead(null)}>
              Leave it
            </Button>
          </span>
        </div>
      ) : standing?.ok ? (
        <div className="pt-3">
          <Preview name="Kept" table={standing.value} />
        </div>
      ) : null}
    </div>
  )
}
