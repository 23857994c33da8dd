'use client'

import { useId, useState } from 'react'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { FieldWords } from '@/lib/domain/facility/recordForm'
import { formatCalendarDate, formatUtcWithYear } from '@/lib/format'
import { compareRecords } from './compareRecords'

export interface ListedVersion {
  recordVersion: number
  validFrom: string
  savedAt: Date
  savedBy: string | null
  /** Its facts as a form holds them. */
  typed: Readonly<Record<string, unknown>>
}

export interface RecordVersionsProps {
  fields: Readonly<Record<string, FieldWords>>
  /** The newest first. */
  versions: readonly ListedVersion[]
  today: string
}

function VersionChoice(props: {
  label: string
  versions: readonly ListedVersion[]
  value: number
  onChange: (version: number) => void
}) {
  const id = useId()
  return (
    <div className="flex items-center gap-2">
      <label htmlFor={id} className="text-table text-muted">
        {props.label}
      </label>
      <select
        id={id}
        value={props.value}
        onChange={(event) => props.onChange(Number(event.target.value))}
        className="min-h-9 rounded border border-edge bg-surface px-2 text-table text-ink max-sm:min-h-11"
      >
        {props.versions.map(({ recordVersion }) => (
          <option key={recordVersion} value={recordVersion}>{`record ${recordVersion}`}</option>
        ))}
      </select>
    </div>
  )
}

/** Every version with its dates and its writer, and any two of them field by field. */
export function RecordVersions({ fields, versions, today }: RecordVersionsProps) {
  const [newest, before] = versions
  const [chosen, setChosen] = useState<{ left?: number; right?: number }>({})
  const left = chosen.left ?? before?.recordVersion ?? 0
  const right = chosen.right ?? newest?.recordVersion ?? 0
  const inForce = versions.find(({ validFrom }) => validFrom <= today)?.recordVersion
  const find = (version: number) => versions.find(({ recordVersion }) => recordVersion === version)
  const [a, b] = [find(left), find(right)]
  const rows = a && b ? compareRecords(fields, a.typed, b.typed) : []
  return (
    <section>
      <SectionHeading title="Versions" dense />
      <ol className="plain-list mt-2 text-table">
        {versions.map((version) => (
          <li key={version.recordVersion} className="border-t border-rule py-2">
            <span className="flex justify-between gap-4">
              <strong className="font-semibold">Record {version.recordVersion}</strong>
              <span className="text-muted">
                {version.recordVersion === inForce
                  ? 'in force'
                  : version.validFrom > today && version === newest
                    ? 'to come'
                    : null}
              </span>
            </span>
            from {formatCalendarDate(version.validFrom)}
            <span className="block text-caption text-muted">
              {version.savedBy
                ? `${version.savedBy}, ${formatUtcWithYear(version.savedAt)}`
                : 'there from the beginning'}
            </span>
          </li>
        ))}
      </ol>
      {a && b ? (
        <div className="mt-6">
          <SectionHeading title="Two versions compared" dense />
          <div className="mt-3 flex flex-wrap gap-x-5 gap-y-2">
            <VersionChoice
              label="This"
              versions={versions}
              value={left}
              onChange={(version) => setChosen({ ...chosen, left: version })}
            />
            <VersionChoice
              label="and"
              versions={versions}
              value={right}
              onChange={(version) => setChosen({ ...chosen, right: version })}
            />
          </div>
          {rows.length === 0 ? (
            <p className="mt-3 text-table text-muted">They say the same.</p>
          ) : (
            <dl className="mt-3 text-table" aria-label={`Record ${left} and record ${right}`}>
              {rows.map((row) => (
                <div key={row.name} className="border-t border-rule py-2 last:border-b">
                  <dt className="text-muted">{row.label}</dt>
                  <dd className="m-0 grid grid-cols-2 gap-4 [overflow-wrap:anywhere]">
                    <span>{row.a}</span>
                    <strong className="font-semibold">{row.b}</strong>
                  </dd>
                </div>
              ))}
            </dl>
          )}
        </div>
      ) : null}
    </section>
  )
}
