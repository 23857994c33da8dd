import type { ReactNode } from 'react'

/** Fields of one thing under its name, two beside each other where there is room. */
export function DetailGroup({
  title,
  note,
  children,
}: {
  title: string
  note?: string
  children: ReactNode
}) {
  return (
    <fieldset className="m-0 min-w-0 border-0 border-t border-rule p-0 pt-2">
      <legend className="float-left w-full text-body font-semibold">{title}</legend>
      {note ? <p className="clear-both m-0 text-caption text-muted">{note}</p> : null}
      <div className="clear-both grid items-end gap-x-4 gap-y-3 pt-2 sm:grid-cols-2">{children}</div>
    </fieldset>
  )
}
