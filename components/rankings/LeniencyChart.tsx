import { SpreadMark } from '@/components/charts/SpreadMark'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { Tag } from '@/components/ui/Tag'
import type { RankingView } from '@/lib/domain/rankings/rankingView'
import { formatNumber, formatSigned } from '@/lib/format'

const chanceOf = (p: number) => (p < 0.0001 ? 'p below 0.0001' : `p ${p.toPrecision(1)}`)

/** How harsh or lenient each reviewer is on shared proposals, by number and for the chair alone. */
export function LeniencyChart({ view }: { view: RankingView }) {
  if (view.leniency.length === 0) return null
  const reach = Math.max(1, ...view.leniency.map((one) => Math.abs(one.points) + one.error))
  return (
    <section>
      <SectionHeading dense title="Leniency" aside={<Tag>for the chair only</Tag>} />
      <p className="mt-2 mb-1 flex justify-between text-tick text-muted">
        <span>harsher, points</span>
        <span>more lenient</span>
      </p>
      <ul className="plain-list">
        {view.leniency.map((one) => (
          <li key={one.reviewer} className="flex items-center justify-between gap-3">
            <span className="w-20 shrink-0 text-tick">Reviewer {one.reviewer}</span>
            <SpreadMark
              value={one.points}
              sigma={one.error}
              domain={[-reach, reach]}
              width={158}
              label={`${formatSigned(one.points, 2)} points, one sigma ${formatNumber(one.error, 2)}`}
            />
          </li>
        ))}
      </ul>
      <p className="mt-1 flex justify-between pl-[92px] text-tick text-muted" aria-hidden="true">
        <span>{formatSigned(-reach, 1)}</span>
        <span>0</span>
        <span>{formatSigned(reach, 1)}</span>
      </p>
      <p className="mt-3 text-caption text-muted">
        {view.test
          ? `F ${formatNumber(view.test.f, 1)} on ${view.test.between} and ${view.test.within}, ${chanceOf(view.test.p)}. `
          : ''}
        {view.corrected
          ? 'Significant, and all reviewers are linked by shared proposals: so merit is corrected.'
          : view.whyNot}
      </p>
    </section>
  )
}
