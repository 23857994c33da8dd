'use client'

import { useEffect, useId } from 'react'
import { FormProvider, useWatch } from 'react-hook-form'
import { CellSelect } from '@/components/rows/CellSelect'
import { hasMessages, RowMessages } from '@/components/rows/RowMessages'
import { TypedCell } from '@/components/rows/TypedCell'
import { useSelfSavingRow } from '@/components/rows/useSelfSavingRow'
import { classNames } from '@/components/ui/classNames'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { TextLink } from '@/components/ui/TextLink'
import { VerdictMark } from '@/components/ui/VerdictMark'
import type { ActionResult } from '@/lib/actions/result'
import { askFor, observationRow } from '@/lib/domain/observations/rules'
import { observationRowSchema, type ObservationRow } from '@/lib/domain/observations/schema'
import type { ObservationComputation } from '@/lib/domain/observations/types'
import type { Observation, ProposalContents } from '@/lib/domain/proposals/types'
import { CountsNote } from '@/components/targets/CountsNote'
import { ABSENT, formatDuration, formatHoursFromSeconds } from '@/lib/format'
import { paths } from '@/lib/paths'
import { NeededCell } from '../targets/NeededCell'
import { FeatureCell } from './FeatureCell'
import { modeFacts } from './modeWords'
import { observationCellNames } from './observationCellNames'

export interface ObservationTableRowProps {
  contents: ProposalContents
  kept: Observation
  number: number
  computed: ObservationComputation | undefined
  readOnly: string | null
  onTyped: (id: number, row: ObservationRow) => void
  save: (row: ObservationRow, version: number | null) => Promise<ActionResult<Observation>>
  onRemove: () => void
}

const spectral = [
  { value: 'resolution-element', label: 'per resolution element' },
  { value: 'pixel', label: 'per pixel' },
  { value: 'angstrom', label: 'per ångström' },
]
const image = [{ value: 'image', label: 'of the image' }]
const columns = 8

/** One observation: target, mode, feature and depth typed; exposure, hours and verdict computed as one types. */
export function ObservationTableRow(props: ObservationTableRowProps) {
  const { contents, kept, number, computed, readOnly, onTyped, save, onRemove } = props
  const messageId = useId()
  const row = useSelfSavingRow({
    schema: observationRowSchema,
    kept,
    empty: observationRow(kept),
    rowOf: observationRow,
    keepAs: readOnly === null ? `observation-${contents.reference}-${kept.id}` : null,
    save,
  })
  const { form, commit } = row
  const typed = useWatch({ control: form.control }) as ObservationRow
  const isWrong = hasMessages(form.formState.errors, row)
  const target = contents.targets.find(({ id }) => id === kept.targetId)
  const mode = contents.modes.find(({ modeId }) => modeId === Number(typed.modeId))
  const name = target?.name ?? `observation ${number}`
  const label = `observation of ${name}`
  const isOff = readOnly !== null

  useEffect(() => onTyped(kept.id, typed), [kept.id, typed, onTyped])

  // Keys of rows say nothing to a reader.
  const say = (cell: keyof ObservationRow, value: unknown): string => {
    const named = {
      targetId: contents.targets.find(({ id }) => id === Number(value))?.name,
      modeId: contents.modes.find(({ modeId }) => modeId === Number(value))?.name,
      constraintSetId: contents.constraintSets.find(({ id }) => id === Number(value))?.name,
    }
    return (cell in named ? named[cell as keyof typeof named] : null) ?? (String(value ?? '') || 'nothing')
  }
  const chosen = () => {
    const next = contents.modes.find(({ modeId }) => modeId === Number(form.getValues('modeId')))
    const per = form.getValues('snrPer')
    if (next && (next.kind === 'imaging') !== (per === 'image'))
      form.setValue('snrPer', next.kind === 'imaging' ? 'image' : 'resolution-element')
    void commit()
  }
  const needed = computed?.neededSeconds ?? null
  const take = () => {
    if (needed === null) return
    form.setValue('askedHours', askFor(needed), { shouldValidate: true })
    void commit()
  }
  const cell = { row: number, readOnly: isOff, messageId }
  return (
    <FormProvider {...form}>
      <tr
        role="row"
        id={`observation-${kept.id}`}
        onBlur={() => void commit()}
        className={classNames(isWrong && 'is-attention has-detail')}
      >
        <th role="rowheader" scope="row" className="min-w-36">
          {name}
          {target?.redshiftTyped ? (
            <span className="block text-tick font-normal text-muted">z = {target.redshiftTyped}</span>
          ) : null}
          {contents.constraintSets.length > 1 ? (
            <CellSelect
              name="constraintSetId"
              label={`Conditions of the ${label}`}
              options={contents.constraintSets.map((set) => ({ value: String(set.id), label: set.name }))}
              readOnly={isOff}
              isNumber
              onChosen={() => void commit()}
            />
          ) : null}
        </th>
        <td role="cell" data-head="Mode" className="min-w-52">
          <span className="block max-sm:w-56 max-sm:text-left">
            <CellSelect
              name="modeId"
              label={`Mode of the ${label}`}
              options={[
                ...(mode || !typed.modeId ? [] : [{ value: String(typed.modeId), label: 'Not on offer' }]),
                ...contents.modes.map(({ modeId, name: words }) => ({
                  value: String(modeId),
                  label: words,
                })),
              ]}
              readOnly={isOff}
              large
              isNumber
              onChosen={chosen}
            />
            {mode ? <span className="block text-tick text-muted">{modeFacts(mode)}</span> : null}
          </span>
        </td>
        <td role="cell" data-head="Feature" className="min-w-44">
          <span className="block max-sm:w-56 max-sm:text-left">
            <FeatureCell
              label={label}
              mode={mode}
              redshift={target?.redshift ?? null}
              observedA={computed?.observedFeatureA ?? null}
              readOnly={isOff}
              onChosen={() => void commit()}
            />
          </span>
        </td>
        <td role="cell" data-head="S/N wanted" className="is-right max-sm:!pl-0 sm:w-32">
          <span className="block max-sm:w-36">
            <TypedCell {...cell} name="wantedSnr" label={`Signal-to-noise wanted, ${label}`} align="right" />
            <CellSelect
              name="snrPer"
              label={`What the signal-to-noise counts, ${label}`}
              options={mode?.kind === 'imaging' ? image : spectral}
              readOnly={isOff}
              align="right"
              onChosen={() => void commit()}
            />
          </span>
        </td>
        <td role="cell" data-head="Exposure" className="is-right is-computed whitespace-nowrap">
          {computed?.subExposures && computed.subExposureSeconds !== null
            ? `${computed.subExposures} × ${formatDuration(computed.subExposureSeconds)}`
            : ABSENT}
        </td>
        <td role="cell" data-head="Needed, h" className="is-right is-computed">
          <NeededCell name={name} computed={computed ? [computed] : []} />
        </td>
        <td role="cell" data-head="Asked, h" className="is-right max-sm:!pl-0 sm:w-20">
          <span className="block max-sm:w-36">
            <TypedCell {...cell} name="askedHours" label={`Hours asked, ${label}`} align="right" />
            {needed !== null && !isOff && typed.askedHours !== askFor(needed) ? (
              <button
                type="button"
                onClick={take}
                className="text-tick text-accent underline underline-offset-2 max-sm:min-h-9"
                aria-label={`Ask for the ${formatHoursFromSeconds(needed)} that ${name} needs`}
              >
                take {askFor(needed)}
              </button>
            ) : null}
            <CountsNote times={computed?.times ?? null} />
          </span>
        </td>
        <td role="cell" data-head="Verdict" className="whitespace-nowrap">
          {computed ? (
            <TextLink
              href={`${paths.proposalSection(contents.reference, 'feasibility')}?observation=${kept.id}`}
              aria-label={`${computed.verdict.replace('-', ' ')}: the checks of ${name}`}
            >
              <VerdictMark verdict={computed.verdict} />
            </TextLink>
          ) : (
            ABSENT
          )}
          {isOff ? null : (
            <span className="block">
              <LinkLikeButton onClick={onRemove} aria-label={`Take the ${label} out`}>
                take out
              </LinkLikeButton>
            </span>
          )}
        </td>
      </tr>
      {isWrong || computed?.refusal ? (
        <tr role="row" className={classNames('is-detail', isWrong && 'is-attention')}>
          <td role="cell" colSpan={columns}>
            {computed?.refusal ? <p className="m-0 text-not-feasible">{computed.refusal}</p> : null}
            <RowMessages id={messageId} row={row} cellNames={observationCellNames} say={say} />
          </td>
        </tr>
      ) : null}
    </FormProvider>
  )
}
