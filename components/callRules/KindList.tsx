'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import { askWords } from '@/components/calls/askWords'
import { limitWords } from '@/components/calls/limitWords'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { noteOwnSave } from '@/components/office/ownSaves'
import { useDeed } from '@/components/proposals/useDeed'
import { Button } from '@/components/ui/Button'
import type { ActionResult } from '@/lib/actions/result'
import type { CallRulesView } from '@/lib/domain/calls/readRules'
import { countInWords, formatHoursFromSeconds, formatNumber, formatUtcWithYear } from '@/lib/format'
import { KindForm, type KindInput } from './KindForm'
import { RuleRow } from './RuleRow'

interface KindListProps {
  view: CallRulesView
  mayChange: boolean
  save: FormAction<KindInput, unknown>
  remove: (input: { slug: string; version: number; kindId: number }) => Promise<ActionResult<unknown>>
}

type Kind = CallRulesView['kinds'][number]

function factsOf(kind: Kind, panel: string): string {
  const hours = kind.maxSeconds === null ? 'any hours' : `at most ${formatHoursFromSeconds(kind.maxSeconds)}`
  const own = kind.closesAt ? `; closes ${formatUtcWithYear(kind.closesAt)}` : ''
  return `${limitWords(kind)}, an abstract of ${formatNumber(kind.abstractLimit, 0)} characters, ${hours}${askWords(kind)}; judged by ${panel}${own}; ${countInWords(kind.proposals, 'proposal')} begun or sent`
}

/** The kinds of proposal a call takes, each with its limits. */
export function KindList({ view, mayChange, save, remove }: KindListProps) {
  const { call, kinds, panels, utcOffsetHours } = view
  const router = useRouter()
  const { busy, run } = useDeed()
  const [open, setOpen] = useState<number | 'new' | null>(null)
  const options = panels.map(({ id, name }) => ({ value: String(id), label: name }))
  const form = (kind: Kind | null) => (
    <KindForm
      call={{ slug: call.slug, version: call.version }}
      kind={kind}
      panels={options}
      utcOffsetHours={utcOffsetHours}
      action={save}
      onClose={() => setOpen(null)}
    />
  )
  const take = (kind: Kind) =>
    run(async () => {
      const answer = await remove({ slug: call.slug, version: call.version, kindId: kind.id })
      if (answer.ok) noteOwnSave(call.slug, call.version + 1)
      router.refresh()
      return answer
    }, `${kind.title} is off this call`)
  return (
    <>
      <ul className="plain-list">
        {kinds.map((kind) => (
          <RuleRow
            key={kind.id}
            name={kind.title}
            facts={factsOf(kind, panels.find(({ id }) => id === kind.panelId)?.name ?? '')}
            form={open === kind.id ? form(kind) : null}
            onEdit={mayChange ? () => setOpen(kind.id) : undefined}
            onRemove={
              mayChange && kind.proposals === 0 && kinds.length > 1 && !busy ? () => take(kind) : undefined
            }
          />
        ))}
      </ul>
      {mayChange ? (
        <div className="border-t border-rule pt-4">
          {open === 'new' ? (
            form(null)
          ) : (
            <Button look="secondary" size="small" onClick={() => setOpen('new')}>
              Add a kind of proposal
            </Button>
          )}
        </div>
      ) : null}
    </>
  )
}
