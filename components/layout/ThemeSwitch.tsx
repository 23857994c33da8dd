'use client'

import { Popover } from 'radix-ui'
import { useState } from 'react'
import { applyTheme } from './applyTheme'
import { themes, type ThemeId } from './themes'

function Swatch({ theme }: { theme: ThemeId }) {
  return (
    <span
      data-theme={theme}
      aria-hidden="true"
      className="inline-block h-2.5 w-3.5 rounded-[2px] border border-edge bg-ground"
    />
  )
}

/** Day for paper, dome for the dark, red lamp for beside the telescope. Kept in a cookie, so the first paint is right. */
export function ThemeSwitch({ initial }: { initial: ThemeId }) {
  const [theme, setTheme] = useState(initial)
  const [open, setOpen] = useState(false)
  const current = themes.find(({ id }) => id === theme)

  const choose = (next: ThemeId) => {
    setTheme(next)
    setOpen(false)
    applyTheme(next)
  }

  return (
    <Popover.Root open={open} onOpenChange={setOpen}>
      <Popover.Trigger
        aria-label={`Theme: ${current?.name ?? ''}`}
        className="inline-flex min-h-8 items-center gap-2 text-table text-muted hover:text-ink max-sm:min-h-11"
      >
        <Swatch theme={theme} />
        {current?.name}
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          align="end"
          sideOffset={8}
          collisionPadding={16}
          className="z-50 min-w-44 float-in rounded border border-edge bg-surface p-1 shadow-float"
        >
          <ul className="plain-list" aria-label="Theme">
            {themes.map(({ id, name }) => (
              <li key={id}>
                <button
                  type="button"
                  aria-pressed={id === theme}
                  onClick={() => choose(id)}
                  className="flex min-h-9 w-full items-center gap-3 rounded px-3 text-left text-table hover:bg-wash aria-pressed:font-semibold max-sm:min-h-11"
                >
                  <Swatch theme={id} />
                  {name}
                </button>
              </li>
            ))}
          </ul>
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  )
}
