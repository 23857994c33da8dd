'use client'

import { useRouter } from 'next/navigation'
import { useState } from 'react'
import type { FormAction } from '@/components/forms/actionFormTypes'
import { noteOwnSave } from '@/components/office/ownSaves'
import { useDeed } from '@/components/proposals/useDeed'
import { Button } from '@/components/ui/Button'
import type { ActionResult } from '@/lib/actions/result'
import type { CallRulesView } from '@/lib/domain/calls/readRules'
import type { CallPanel } from '@/lib/domain/calls/types'
import { countInWords } from '@/lib/format'
import { PanelForm, type PanelInput } from './PanelForm'
import { RuleRow } from './RuleRow'

interface PanelListProps {
  view: Pick<CallRulesView, 'call' | 'panels'>
  mayChange: boolean
  save: FormAction<PanelInput, unknown>
  remove: (input: { slug: string; version: number; panelId: number }) => Promise<ActionResult<unknown>>
}

/** The panels of a call; who sits on them is the business of the People page. */
export function PanelList({ view: { call, panels }, mayChange, save, remove }: PanelListProps) {
  const router = useRouter()
  const { busy, run } = useDeed()
  const [open, setOpen] = useState<number | 'new' | null>(null)
  const form = (panel: CallPanel | null) => (
    <PanelForm
      call={{ slug: call.slug, version: call.version }}
      panel={panel}
      action={save}
      onClose={() => setOpen(null)}
    />
  )
  const take = (panel: CallPanel) =>
    run(async () => {
      const answer = await remove({ slug: call.slug, version: call.version, panelId: panel.id })
      if (answer.ok) noteOwnSave(call.slug, call.version + 1)
      router.refresh()
      return answer
    }, `${panel.name} is off this call`)
  return (
    <>
      <ul className="plain-list">
        {panels.map((panel) => (
          <RuleRow
            key={panel.id}
            name={panel.name}
            facts={`${countInWords(panel.members, 'member sits', 'members sit', true)} on it, ${countInWords(panel.quorum, 'is', 'are')} needed to decide`}
            form={open === panel.id ? form(panel) : null}
            onEdit={mayChange ? () => setOpen(panel.id) : undefined}
            onRemove={mayChange && panels.length > 1 && !busy ? () => take(panel) : undefined}
          />
        ))}
      </ul>
      {mayChange ? (
        <div className="border-t border-rule pt-4">
          {open === 'new' ? (
            form(null)
          ) : (
            <Button look="secondary" size="small" onClick={() => setOpen('new')}>
              Add a panel
            </Button>
          )}
        </div>
      ) : null}
    </>
  )
}
