import { GroupLine } from '@/components/observations/GroupLine'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { AnonymousProposal } from '@/lib/domain/packets/anonymise'
import type { FeasibilityCheck } from '@/lib/domain/observations/types'
import { countInWords } from '@/lib/format'
import { CheckTable } from './CheckTable'

const rank = { 'not-feasible': 0, marginal: 1, feasible: 2 } as const

interface Row extends FeasibilityCheck {
  key: string
  where: string
}

/** Checks of all observations, the worst first; the clear ones behind one click. */
export function ChecksList({ proposal }: { proposal: AnonymousProposal }) {
  const targets = new Map(proposal.targets.map(({ id, name }) => [id, name]))
  const modeOf = new Map(proposal.observations.map(({ id, modeId }) => [id, modeId]))
  const modes = new Map(proposal.modes.map(({ modeId, name }) => [modeId, name]))
  const rows: Row[] = proposal.computation.observations
    .flatMap(({ observationId, targetId, checks }) =>
      checks.map((check) => ({
        ...check,
        key: `${observationId}-${check.id}`,
        where: `${targets.get(targetId) ?? ''}, ${modes.get(modeOf.get(observationId) ?? 0) ?? ''}`,
      })),
    )
    .sort((a, b) => rank[a.verdict] - rank[b.verdict])
  const open = rows.filter(({ verdict }) => verdict !== 'feasible')
  const clear = rows.filter(({ verdict }) => verdict === 'feasible')
  const { checksClear, checksTotal, groups, verdict } = proposal.computation
  return (
    <div>
      <p className="m-0 mb-3 text-table">
        {verdict ? <VerdictMark verdict={verdict} strong /> : null}{' '}
        <span className="text-muted">
          {checksClear} of {checksTotal} checks clear, computed by engine {proposal.engineVersion} under{' '}
          {proposal.computation.cosmologyName}.
        </span>
      </p>
      {groups.map((group) => (
        <div key={group.name} className="mb-3">
          <GroupLine group={group} />
        </div>
      ))}
      {open.length > 0 ? <CheckTable caption="Checks that are not clear" rows={open} /> : null}
      {clear.length > 0 ? (
        <details className="mt-3">
          <summary className="min-h-8 text-table text-accent">
            {countInWords(clear.length, 'check that is clear', 'checks that are clear', true)}
          </summary>
          <div className="mt-2">
            <CheckTable caption="Checks that are clear" rows={clear} />
          </div>
        </details>
      ) : null}
    </div>
  )
}
