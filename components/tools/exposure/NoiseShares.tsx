import { formatNumber, formatPercent } from '@/lib/format'
import type { ExposureReport } from '@/lib/science/exposure'

const parts = [
  { key: 'source', name: 'the source itself', colour: 'var(--s1)' },
  { key: 'sky', name: 'the sky', colour: 'var(--s2)' },
  { key: 'dark', name: 'dark current', colour: 'var(--s3)' },
  { key: 'read', name: 'read-out', colour: 'var(--s4)' },
  { key: 'floor', name: 'sky left after subtraction', colour: 'var(--ink-muted)' },
] as const

/** What the noise is made of: a bar of variances, then each with its electrons. */
export function NoiseShares({ variance }: { variance: ExposureReport['variance'] }) {
  const whole = parts.reduce((sum, { key }) => sum + variance[key], 0)
  const shown = parts.filter(({ key }) => variance[key] > 0)
  return (
    <section>
      <h3 className="mb-3 text-body font-semibold">Where the noise comes from</h3>
      <div className="flex h-6 gap-px overflow-hidden rounded" aria-hidden="true">
        {shown.map(({ key, colour }) => (
          <span key={key} style={{ width: `${(100 * variance[key]) / whole}%`, background: colour }} />
        ))}
      </div>
      <table className="mt-3 w-full text-table">
        <thead className="sr-only">
          <tr>
            <th scope="col">From</th>
            <th scope="col">Electrons of noise</th>
            <th scope="col">Share of the noise squared</th>
          </tr>
        </thead>
        <tbody>
          {shown.map(({ key, name, colour }) => (
            <tr key={key} className="border-b border-rule">
              <th scope="row" className="py-1.5 text-left font-normal">
                <span className="rounded-sm mr-2 inline-block size-2.5" style={{ background: colour }} />
                {name}
              </th>
              <td className="py-1.5 text-right">± {formatNumber(Math.sqrt(variance[key]), 0)} e⁻</td>
              <td className="w-20 py-1.5 text-right">{formatPercent(variance[key] / whole, 0)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  )
}
