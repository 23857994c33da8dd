'use client'

import { useCallback, useMemo, useState, type ReactNode } from 'react'
import { Button } from '@/components/ui/Button'
import { EmptyState } from '@/components/ui/EmptyState'
import { LinkButton } from '@/components/ui/LinkButton'
import { PageTitle } from '@/components/ui/PageTitle'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { showToast } from '@/components/ui/showToast'
import { askFor, hoursText } from '@/lib/domain/observations/rules'
import { observationRowSchema, type ObservationRow } from '@/lib/domain/observations/schema'
import type { ProposalComputation } from '@/lib/domain/observations/types'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { paths } from '@/lib/paths'
import { AddObservations } from './AddObservations'
import { ConstraintSets } from './ConstraintSets'
import type { ObservationActions } from './observationActions'
import { ServiceWishes } from './ServiceWishes'
import { ObservationTable } from './ObservationTable'
import { useLiveComputation } from './useLiveComputation'

export interface ObservingEditorProps {
  contents: ProposalContents
  computation: ProposalComputation
  readOnly: string | null
  /** Stands between the title and the tables. */
  note?: ReactNode
  actions: ObservationActions
}

/** The observations as typed; the very contents that were given while nothing differs from them. */
function typedContents(
  contents: ProposalContents,
  typed: Readonly<Record<number, ObservationRow>>,
): ProposalContents {
  let differs = false
  const observations = contents.observations.map((kept) => {
    const row = observationRowSchema.safeParse(typed[kept.id])
    if (!row.success) return kept
    const { askedHours: _, constraintSetId, ...values } = row.data
    const live = { ...kept, ...values, constraintSetId: constraintSetId ?? kept.constraintSetId }
    if (JSON.stringify(live) === JSON.stringify(kept)) return kept
    differs = true
    return live
  })
  return differs ? { ...contents, observations } : contents
}

/** The observing page: conditions in plain fields, then a row for each target with a mode. */
export function ObservingEditor({ contents, computation, readOnly, note, actions }: ObservingEditorProps) {
  const { reference } = contents
  const [typed, setTyped] = useState<Readonly<Record<number, ObservationRow>>>({})
  const [busy, setBusy] = useState(false)
  const live = useLiveComputation(
    contents,
    computation,
    useMemo(() => typedContents(contents, typed), [contents, typed]),
  )
  const onTyped = useCallback(
    (id: number, row: ObservationRow) =>
      setTyped((before) =>
        JSON.stringify(before[id]) === JSON.stringify(row) ? before : { ...before, [id]: { ...row } },
      ),
    [],
  )

  const remove = async (id: number) => {
    const result = await actions.remove({ reference, id })
    if (!result.ok) return showToast(result.message)
    const { row } = result.data
    showToast('Observation taken out', {
      undo: () => {
        void actions.add({ reference, row }).then((back) => {
          if (!back.ok) showToast(back.message)
        })
      },
    })
  }

  const different = live.observations.flatMap(({ observationId, neededSeconds }) => {
    const kept = contents.observations.find(({ id }) => id === observationId)
    if (!kept || neededSeconds === null) return []
    const askedHours = askFor(neededSeconds)
    return Number(hoursText(kept.askedSeconds)) === Number(askedHours)
      ? []
      : [{ id: kept.id, version: kept.version, askedHours }]
  })
  const askForAll = async () => {
    setBusy(true)
    const result = await actions.ask({ reference, asked: different })
    setBusy(false)
    showToast(result.ok ? 'Asked for what is needed' : result.message)
  }

  return (
    <>
      <PageTitle
        title="Observing"
        lead={
          readOnly ??
          'What must be measured: target, instrument mode, depth and hours. Every row saves itself.'
        }
        actions={
          readOnly === null && different.length > 0 ? (
            <Button look="secondary" busy={busy} busyWord="Asking" onClick={() => void askForAll()}>
              Ask for what is needed
            </Button>
          ) : undefined
        }
      />
      <div className="mt-6 flex flex-col gap-10">
        {note}
        <ConstraintSets contents={contents} readOnly={readOnly !== null} save={actions.saveConstraints} />
        <section>
          <SectionHeading title="Observations" />
          <div className="mt-3">
            {contents.targets.length === 0 ? (
              <EmptyState
                title="No target to observe yet"
                actions={
                  <LinkButton href={paths.proposalSection(reference, 'targets')}>Add a target</LinkButton>
                }
              >
                Name the targets first; then say with which instrument each is observed, and how deep.
              </EmptyState>
            ) : contents.observations.length === 0 ? (
              <EmptyState title="Nothing is observed yet">
                {readOnly ? 'This proposal asks for nothing.' : 'Choose a target and a mode below.'}
              </EmptyState>
            ) : (
              <ObservationTable
                contents={contents}
                computation={live}
                readOnly={readOnly}
                onTyped={onTyped}
                save={(id) => (row, version) => actions.save({ reference, id, version: version ?? 0, row })}
                onRemove={(id) => void remove(id)}
              />
            )}
          </div>
          {readOnly === null && contents.targets.length > 0 ? (
            <div className="mt-5">
              <AddObservations contents={contents} add={actions.add} />
            </div>
          ) : null}
        </section>
        {contents.observations.length > 0 ? (
          <ServiceWishes contents={contents} readOnly={readOnly !== null} save={actions.saveWish} />
        ) : null}
      </div>
    </>
  )
}
