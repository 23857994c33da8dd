'use client'

import { useDeferredValue, useMemo, useState } from 'react'
import { BarNote } from '@/components/ui/BarNote'
import { UnderlineChoice } from '@/components/ui/UnderlineChoice'
import type { OwnText, YardstickState } from '@/lib/domain/tools/yardstick/state'
import { writeState } from '@/lib/domain/tools/yardstick/stateQuery'
import { chosenUniverses } from '@/lib/domain/tools/yardstick/universes'
import { viewOf } from '@/lib/domain/tools/yardstick/viewOf'
import { Foot } from './Foot'
import { Numbers } from './Numbers'
import { OwnParameters } from './OwnParameters'
import { RightColumn } from './RightColumn'
import { SideColumn } from './SideColumn'
import { useListTypedEarly } from './useListTypedEarly'
import { redshiftsFor, useYardstickState } from './useYardstickState'

export interface YardstickProps {
  /** What the address asks. */
  initial: YardstickState
  /** Sentences for what in the address names nothing. */
  troubles: readonly string[]
}

const modes = [
  { value: 'distances', label: 'Distances and times' },
  { value: 'compare', label: 'One against another' },
  { value: 'near', label: 'Near by' },
  { value: 'survey', label: 'Count in a survey' },
  { value: 'inverse', label: 'Find the redshift' },
] as const

/** Redshifts in, distances and times out: computed here as one types, by the engine the server uses. */
export function Yardstick({ initial, troubles }: YardstickProps) {
  const { state, change } = useYardstickState(initial)
  useListTypedEarly((text) => change(initial.mode === 'inverse' ? { values: text } : { z: text }))
  // Typing goes first; tables and plots follow when there is time.
  const deferred = useDeferredValue(state)
  const chosen = useMemo(() => chosenUniverses(deferred.cosmologies), [deferred.cosmologies])
  const view = useMemo(() => viewOf(deferred, chosen), [deferred, chosen])
  const linkable = useMemo(() => writeState(deferred) !== null, [deferred])
  const [pointed, setPointed] = useState<number | null>(null)
  const [editing, setEditing] = useState<number | null>(() => {
    const wrong = view.universes.find(({ cosmology }) => cosmology === null)
    return wrong ? wrong.place : null
  })
  const own = editing === null ? null : state.cosmologies[editing]?.own
  const universe = editing === null ? null : view.universes[editing]
  const edit = (next: OwnText) =>
    change({
      cosmologies: state.cosmologies.map((one, at) => (at === editing ? { own: next, id: null } : one)),
    })

  return (
    <>
      <div className="mt-5">
        <UnderlineChoice
          main
          label="What to do"
          options={modes}
          value={state.mode}
          onChange={(mode) => change({ mode, z: redshiftsFor(mode, state.z) })}
        />
      </div>
      {troubles.map((sentence) => (
        <div key={sentence} className="mt-4">
          <BarNote tone="not-feasible">{sentence}</BarNote>
        </div>
      ))}
      <div className="mt-8 grid gap-x-8 gap-y-10 lg:grid-cols-[14.75rem_minmax(0,1fr)]">
        <SideColumn state={state} view={view} editing={editing} onEdit={setEditing} onChange={change} />
        <div className="min-w-0 border-rule lg:border-l lg:pl-8">
          {own && universe ? (
            <OwnParameters own={own} universe={universe} onChange={edit} onDone={() => setEditing(null)} />
          ) : null}
          <RightColumn view={view} onChange={change} pointed={pointed} onPoint={setPointed} />
        </div>
      </div>
      {view.sheet ? (
        <Numbers
          sheet={view.sheet}
          universes={view.ready}
          pointed={pointed}
          linkable={linkable}
          columns={deferred.mode === 'distances' || deferred.mode === 'compare' ? deferred.columns : null}
          onChange={change}
        />
      ) : null}
      <Foot universes={view.ready} />
    </>
  )
}
