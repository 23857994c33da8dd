'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/Button'
import { SectionHeading } from '@/components/ui/SectionHeading'
import { ruleHelp, ruleNames } from '@/lib/domain/sharing/ruleWords'
import type { SharingView } from '@/lib/domain/sharing/sharingView'
import { formatList, formatUtc } from '@/lib/format'
import { RuleForm } from './RuleForm'
import type { SaveShareRule } from './sharingActions'

type Percents = SharingView['percents']

/** The rule that holds, who laid it down and why, what was written before, and changing it while it may be changed. */
export function RuleSection({ view, save }: { view: SharingView; save: SaveShareRule }) {
  const [isOpen, setOpen] = useState(false)
  const nameOf = (id: number) => view.panels.find((panel) => panel.id === id)?.name ?? ''
  const inWords = (percents: Percents) =>
    percents.length === 0
      ? ''
      : `: ${formatList(percents.map(({ panelId, percent }) => `${nameOf(panelId)} ${percent} %`))}`
  return (
    <section>
      <SectionHeading title="The rule" />
      <p className="mt-2 mb-0 text-body">
        <strong>
          {ruleNames[view.rule]}
          {inWords(view.percents)}.
        </strong>{' '}
        <span className="text-muted">{ruleHelp[view.rule]}</span>
      </p>
      {view.written.length === 0 ? (
        <p className="mt-2 mb-0 max-w-prose text-table text-muted">
          Nobody has laid down another rule: this one holds by itself.
        </p>
      ) : (
        <ul className="plain-list mt-3 max-w-prose text-table">
          {view.written.map((one) => (
            <li key={one.at} className="border-t border-rule py-2">
              {one.isStanding ? null : (
                <span className="text-muted">
                  Earlier: {ruleNames[one.rule]}
                  {inWords(one.percents)}.{' '}
                </span>
              )}
              {one.reason}{' '}
              <span className="text-muted">
                {one.by}, {formatUtc(new Date(one.at))}
              </span>
            </li>
          ))}
        </ul>
      )}
      {view.ruleFixed ? (
        <p className="mt-3 mb-0 max-w-prose text-table text-muted">{view.ruleFixed}</p>
      ) : isOpen ? (
        <div className="mt-4 max-w-prose">
          <RuleForm view={view} save={save} onLeave={() => setOpen(false)} />
        </div>
      ) : (
        <div className="mt-3">
          <Button look="secondary" size="small" onClick={() => setOpen(true)}>
            Lay down another rule
          </Button>
        </div>
      )}
    </section>
  )
}
