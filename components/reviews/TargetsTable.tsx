import { TableFrame } from '@/components/tables/TableFrame'
import { awaitedWords } from '@/lib/domain/observations/rules'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { ABSENT, formatNumber } from '@/lib/format'
import { formatDeclination, formatRightAscension } from '@/lib/format/sexagesimal'

const heads = [
  ['Target', null],
  ['Right ascension', 'ICRS'],
  ['Declination', 'ICRS'],
  ['z', null],
  ['Magnitude', null],
  ['Scale', 'kpc/″'],
  ['Lookback', 'Gyr'],
] as const

/** Targets with what was computed for each under the stated cosmology. */
export function TargetsTable({ proposal }: { proposal: AnonymousProposal }) {
  const computed = new Map(proposal.computation.targets.map((row) => [row.targetId, row]))
  return (
    <TableFrame caption="Targets" phone="scroll">
      <thead>
        <tr>
          {heads.map(([head, unit], index) => (
            <th key={head} scope="col" className={index > 2 ? 'is-right' : undefined}>
              {head}
              {unit ? <span className="unit">{unit}</span> : null}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {proposal.targets.map((target) => {
          const row = computed.get(target.id)
          const magnitude = target.brightness
          return (
            <tr key={target.id}>
              <th scope="row">
                {target.name}
                {target.group || awaitedWords(target) ? (
                  <span className="block max-w-72 text-caption font-normal text-muted">
                    {[target.group, awaitedWords(target)].filter(Boolean).join('. ')}
                  </span>
                ) : null}
              </th>
              <td className="whitespace-nowrap">
                {target.raDeg === null ? ABSENT : formatRightAscension(target.raDeg)}
              </td>
              <td className="whitespace-nowrap">
                {target.decDeg === null ? ABSENT : formatDeclination(target.decDeg)}
              </td>
              <td className="is-right">{target.redshift === null ? ABSENT : target.redshiftTyped}</td>
              <td className="is-right whitespace-nowrap">
                {magnitude
                  ? `${formatNumber(magnitude.value, 2)} ${magnitude.band} ${magnitude.system}`
                  : ABSENT}
              </td>
              <td className="is-right is-computed">{formatNumber(row?.kpcPerArcsec, 3)}</td>
              <td className="is-right is-computed">{formatNumber(row?.lookbackGyr, 2)}</td>
            </tr>
          )
        })}
      </tbody>
    </TableFrame>
  )
}
