'use client'

import { useId, useState } from 'react'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { ProposalContents } from '@/lib/domain/proposals/types'
import { newObservationRow } from '@/lib/domain/observations/rules'
import { countInWords } from '@/lib/format'
import { modeFacts, modeOptions } from './modeWords'
import type { ObservationActions } from './observationActions'

export interface AddObservationsProps {
  contents: ProposalContents
  add: ObservationActions['add']
}

const control =
  'min-h-10 w-full rounded border border-edge bg-surface px-3 text-table text-ink max-sm:min-h-11'

/** One target, or all that nothing observes yet, with a mode on offer. */
export function AddObservations({ contents, add }: AddObservationsProps) {
  const id = useId()
  const { targets, observations, modes, reference } = contents
  const observed = new Set(observations.map(({ targetId }) => targetId))
  const bare = targets.filter((target) => !observed.has(target.id))
  const [who, setWho] = useState(bare.length > 1 ? 'bare' : String(bare[0]?.id ?? targets[0]?.id ?? ''))
  const [modeId, setModeId] = useState(String(modes[0]?.modeId ?? ''))
  const [busy, setBusy] = useState(false)
  const mode = modes.find((one) => String(one.modeId) === modeId)
  const groups = [...new Set(modeOptions(modes).map(({ group }) => group))]
  const isBare = who === 'bare' && bare.length > 0
  const chosen = isBare ? bare : targets.filter((target) => String(target.id) === who)

  const go = async () => {
    if (!mode || chosen.length === 0) return
    setBusy(true)
    for (const target of chosen) {
      const result = await add({ reference, row: newObservationRow(target.id, mode) })
      if (result.ok) continue
      showToast(Object.values(result.fieldErrors)[0] ?? result.message)
      break
    }
    setBusy(false)
    setWho(String(targets[0]?.id ?? ''))
  }

  return (
    <div className="grid items-end gap-4 pt-5 rule-part sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto]">
      <div>
        <label htmlFor={`${id}-who`} className="text-table font-semibold">
          Observe
        </label>
        <select
          id={`${id}-who`}
          value={isBare ? 'bare' : who}
          onChange={(event) => setWho(event.target.value)}
          className={control}
        >
          {bare.length > 1 ? (
            <option value="bare">{countInWords(bare.length, 'target')} that nothing observes yet</option>
          ) : null}
          {targets.map((target) => (
            <option key={target.id} value={String(target.id)}>
              {target.name}
            </option>
          ))}
        </select>
      </div>
      <div>
        <label htmlFor={`${id}-mode`} className="text-table font-semibold">
          with
        </label>
        <select
          id={`${id}-mode`}
          value={modeId}
          onChange={(event) => setModeId(event.target.value)}
          aria-describedby={`${id}-facts`}
          className={control}
        >
          {groups.map((group) => (
            <optgroup key={group} label={group}>
              {modeOptions(modes)
                .filter((option) => option.group === group)
                .map(({ value, label }) => (
                  <option key={value} value={value}>
                    {label}
                  </option>
                ))}
            </optgroup>
          ))}
        </select>
      </div>
      <Button look="secondary" busy={busy} busyWord="Adding" onClick={() => void go()}>
        Add
      </Button>
      <p id={`${id}-facts`} className="m-0 text-caption text-muted sm:col-span-3">
        {mode ? modeFacts(mode) : ''}
      </p>
    </div>
  )
}
