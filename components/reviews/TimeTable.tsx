import { TableFrame } from '@/components/tables/TableFrame'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import { ABSENT, formatCountedHours, formatNumber } from '@/lib/format'

const hours = (seconds: number | null | undefined) =>
  formatNumber(seconds === null || seconds === undefined ? null : seconds / 3600, 1)

/** Time asked against time needed, an observation a row. */
export function TimeTable({ proposal }: { proposal: AnonymousProposal }) {
  const { computation, observations } = proposal
  const computed = new Map(computation.observations.map((row) => [row.observationId, row]))
  const names = new Map(proposal.targets.map(({ id, name }) => [id, name]))
  const modes = new Map(proposal.modes.map((mode) => [mode.modeId, mode]))
  const isBracketed = computation.observations.some(({ times }) => times === 0)
  return (
    <>
      <TableFrame caption="Time asked" phone="scroll">
        <thead>
          <tr>
            <th scope="col">Target</th>
            <th scope="col">Mode</th>
            {['S/N', 'Needed', 'Asked'].map((head) => (
              <th key={head} scope="col" className="is-right">
                {head}
                <span className="unit">{head === 'S/N' ? 'wanted' : 'h'}</span>
              </th>
            ))}
            <th scope="col">Verdict</th>
          </tr>
        </thead>
        <tbody>
          {observations.map((observation) => {
            const row = computed.get(observation.id)
            const mode = modes.get(observation.modeId)
            return (
              <tr key={observation.id}>
                <th scope="row">{names.get(observation.targetId)}</th>
                <td>{mode?.name}</td>
                <td className="is-right">{formatNumber(observation.wantedSnr, 0)}</td>
                <td className="is-right is-computed">
                  {row && row.neededSeconds !== null
                    ? formatCountedHours(row.neededSeconds, row.times)
                    : ABSENT}
                </td>
                <td className="is-right">{formatCountedHours(observation.askedSeconds, row?.times ?? 1)}</td>
                <td className="whitespace-nowrap">{row ? <VerdictMark verdict={row.verdict} /> : null}</td>
              </tr>
            )
          })}
        </tbody>
        <tfoot>
          <tr>
            <td colSpan={3}>All</td>
            <td className="is-right is-computed">{hours(computation.neededSeconds)}</td>
            <td className="is-right">{hours(computation.askedSeconds)}</td>
            <td>{formatNumber(computation.askedNights, 2)} nights</td>
          </tr>
        </tfoot>
      </TableFrame>
      {isBracketed ? (
        <p className="mt-2 text-caption text-muted">Hours in brackets are not counted in those of all.</p>
      ) : null}
    </>
  )
}
