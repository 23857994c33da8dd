'use client'

import { useEffect, useId, useRef } from 'react'
import { classNames } from './classNames'

export interface UnderlineChoiceProps<Value extends string> {
  /** Names the choice; shown before it when `shown` is set. */
  label: string
  shown?: boolean
  options: readonly { value: Value; label: string }[]
  value: Value
  onChange: (value: Value) => void
  /** Under the page's title: taller, ruled over the whole width. */
  main?: boolean
}

/** One of a few, as words in a line; the chosen one stands on an ink line. Radios, so that arrow keys move it. */
export function UnderlineChoice<Value extends string>(props: UnderlineChoiceProps<Value>) {
  const { label, shown = false, options, value, onChange, main = false } = props
  const name = useId()
  const group = useRef<HTMLFieldSetElement>(null)
  useEffect(() => {
    // A choice made before the page had come to life stands in the page only.
    const early = group.current?.querySelector<HTMLInputElement>('input:checked')?.value
    const chosen = options.find((option) => option.value === early)
    if (chosen && chosen.value !== value) onChange(chosen.value)
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [])
  return (
    <fieldset
      ref={group}
      className={classNames(
        'm-0 flex min-w-0 flex-wrap items-stretch gap-x-5 border-0 p-0 text-table',
        main && 'gap-x-7 border-b border-rule max-sm:grid max-sm:grid-cols-2 max-sm:gap-x-4',
      )}
    >
      <legend className={shown ? 'mr-5 py-1.5 text-muted sm:float-left' : 'sr-only'}>{label}</legend>
      {options.map((option) => {
        const on = option.value === value
        return (
          <label
            key={option.value}
            className={classNames(
              'relative flex cursor-pointer items-center border-b-2 has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-lamp max-sm:min-h-11',
              main ? '-mb-px min-h-12 pt-0.5' : 'min-h-8',
              on
                ? 'border-ink font-semibold text-ink'
                : classNames(
                    'border-transparent',
                    main
                      ? 'text-muted hover:text-ink'
                      : 'text-accent underline decoration-1 underline-offset-4 hover:decoration-2',
                  ),
            )}
          >
            <input
              type="radio"
              name={name}
              value={option.value}
              checked={on}
              onChange={() => onChange(option.value)}
              className="absolute inset-0 m-0 cursor-pointer appearance-none opacity-0"
            />
            {option.label}
          </label>
        )
      })}
    </fieldset>
  )
}
