import { BarNote } from '@/components/ui/BarNote'
import { TextLink } from '@/components/ui/TextLink'
import type { Clash } from '@/lib/domain/observations/readClashes'
import type { ReportContents } from '@/lib/domain/observations/reportContents'
import { paths } from '@/lib/paths'

export interface ClashNotesProps {
  contents: ReportContents
  clashes: readonly Clash[]
}

function Holder({ clash }: { clash: Clash }) {
  if (clash.kind === 'awarded')
    return (
      <>
        held by the awarded programme <strong className="font-semibold">{clash.reference}</strong>.
      </>
    )
  return (
    <>
      in your proposal <TextLink href={paths.proposal(clash.reference)}>{clash.reference}</TextLink> of call{' '}
      {clash.callNumber}.
    </>
  )
}

/** Observations that are held or asked for already, and what to do about it. */
export function ClashNotes({ contents, clashes }: ClashNotesProps) {
  if (clashes.length === 0) return null
  const nameOf = (observationId: number) => {
    const observation = contents.observations.find(({ id }) => id === observationId)
    const target = contents.targets.find(({ id }) => id === observation?.targetId)
    const mode = contents.modes.find(({ modeId }) => modeId === observation?.modeId)
    return [target?.name, mode?.name].filter(Boolean).join(', ')
  }
  const keyOf = ({ observationId, reference }: Clash) => `${observationId} ${reference}`
  return (
    <div className="mb-8 max-w-prose">
      <BarNote tone="marginal">
        <p className="m-0 font-semibold">Same position, mode and depth already held or asked for</p>
        <ul className="plain-list mt-1 flex flex-col gap-1">
          {clashes.map((clash) => (
            <li key={keyOf(clash)} className="[overflow-wrap:anywhere]">
              {nameOf(clash.observationId)}: <Holder clash={clash} />
            </li>
          ))}
        </ul>
        <p className="m-0 mt-2 text-muted">
          Say in the justification why it must be measured again, or leave it out. Positions within 5″ in the
          same mode count as the same, half the time or more as the same depth.
        </p>
      </BarNote>
    </div>
  )
}
