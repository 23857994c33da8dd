import { SectionHeading } from '@/components/ui/SectionHeading'
import { countedSeconds, type TargetHours } from '@/lib/domain/assessments/rules'
import type { ModeRecord } from '@/lib/domain/facility/types'
import { formatDuration, formatNumber, formatPercent } from '@/lib/format'

export interface OverheadsTableProps {
  modes: readonly ModeRecord[]
  targets: readonly TargetHours[]
}

/** What the engine adds to the open shutter, as the instrument's record says, and what it comes to. */
export function OverheadsTable({ modes, targets }: OverheadsTableProps) {
  const open = countedSeconds(targets, 'openSeconds')
  const over = countedSeconds(targets, 'overheadSeconds')
  return (
    <section>
      <SectionHeading title="Overheads" dense />
      {modes.map(({ modeId, name, overheads }) => (
        <div key={modeId} className="mt-3 text-table">
          <p className="m-0 pb-1 font-semibold">{name}</p>
          <dl className="m-0">
            {[
              ['Acquisition', formatDuration(overheads.acquisitionS), 'a target'],
              ['Read-out', formatDuration(overheads.readoutS), 'an exposure'],
              ['Dither', formatDuration(overheads.ditherS), 'an exposure'],
              ['Calibration', formatPercent(overheads.calibrationFraction, 0), 'of the open shutter'],
            ].map(([term, value, per]) => (
              <div
                key={term}
                className="grid grid-cols-[minmax(0,1fr)_5rem_minmax(0,9rem)] gap-x-3 border-t border-rule py-2 last:border-b"
              >
                <dt>{term}</dt>
                <dd className="m-0 text-right">{value}</dd>
                <dd className="m-0 text-muted">{per}</dd>
              </div>
            ))}
          </dl>
        </div>
      ))}
      <p className="mt-3 text-table text-muted">
        In all {formatNumber(over / 3600, 2)} h over {formatNumber(open / 3600, 2)} h of open shutter. Where
        yours differ, say so in the true hours.
      </p>
    </section>
  )
}
