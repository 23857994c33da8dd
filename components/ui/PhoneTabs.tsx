'use client'

import { useId, useRef, useState, type KeyboardEvent, type ReactNode } from 'react'
import { classNames } from './classNames'

export interface PhoneTabsProps {
  label: string
  panels: { id: string; label: string; content: ReactNode }[]
  /** How the panels stand side by side on wide screens, where there are no tabs. */
  wide: string
  initial?: string
}

/** On narrow screens one panel at a time under 44 px tabs; on wide ones all of them side by side. */
export function PhoneTabs({ label, panels, wide, initial }: PhoneTabsProps) {
  const base = useId()
  const [chosen, setChosen] = useState(initial ?? panels[0]?.id ?? '')
  const list = useRef<HTMLDivElement>(null)

  const onKeyDown = (event: KeyboardEvent) => {
    const step = event.key === 'ArrowRight' ? 1 : event.key === 'ArrowLeft' ? -1 : 0
    if (step === 0) return
    event.preventDefault()
    const at = panels.findIndex(({ id }) => id === chosen)
    const next = panels[(at + step + panels.length) % panels.length]
    if (!next) return
    setChosen(next.id)
    list.current?.querySelector<HTMLButtonElement>(`[data-tab="${next.id}"]`)?.focus()
  }

  return (
    <div>
      <div
        ref={list}
        role="tablist"
        aria-label={label}
        onKeyDown={onKeyDown}
        data-sticky
        className="sticky top-0 z-20 grid auto-cols-fr grid-flow-col border-b border-rule bg-surface lg:hidden"
      >
        {panels.map((panel) => {
          const on = panel.id === chosen
          return (
            <button
              key={panel.id}
              type="button"
              role="tab"
              id={`${base}-${panel.id}-tab`}
              data-tab={panel.id}
              aria-selected={on}
              aria-controls={`${base}-${panel.id}`}
              tabIndex={on ? 0 : -1}
              onClick={() => setChosen(panel.id)}
              className={classNames(
                'min-h-11 text-body',
                on ? 'border-b-[3px] border-ink font-semibold' : 'text-muted',
              )}
            >
              {panel.label}
            </button>
          )
        })}
      </div>
      <div className={wide}>
        {panels.map((panel) => (
          <div
            key={panel.id}
            role="tabpanel"
            id={`${base}-${panel.id}`}
            aria-labelledby={`${base}-${panel.id}-tab`}
            className={classNames('min-w-0', panel.id !== chosen && 'max-lg:hidden')}
          >
            {panel.content}
          </div>
        ))}
      </div>
    </div>
  )
}
