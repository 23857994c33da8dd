'use client'

import { useRef, useState, type DragEvent, type ReactNode } from 'react'
import { useController, useFormContext } from 'react-hook-form'
import { Button } from '@/components/ui/Button'
import { classNames } from '@/components/ui/classNames'
import { describedBy } from './describedBy'
import { FieldFrame } from './FieldFrame'
import { fileProblem, type FileRules } from './fileProblem'
import { FileRow, type FileSending } from './FileRow'
import { useField } from './useField'

export interface FileFieldProps extends FileRules {
  name: string
  label: ReactNode
  help?: ReactNode
  optional?: boolean
  /** While it is on its way. */
  sending?: FileSending | null
  /** Called with a file that passed the first look, to send it at once. */
  onFile?: (file: File) => void
}

/** A file, dropped or chosen; its size and ending are checked before anything is sent. */
export function FileField({
  name,
  label,
  help,
  optional,
  endings,
  maxBytes,
  sending = null,
  onFile,
}: FileFieldProps) {
  const field = useField(name)
  const { setError, clearErrors } = useFormContext()
  const { field: bound } = useController({ name, control: field.control })
  const input = useRef<HTMLInputElement>(null)
  const [over, setOver] = useState(false)
  const file: unknown = bound.value

  const take = (next: File | undefined) => {
    if (!next) return
    const problem = fileProblem(next, { endings, maxBytes })
    if (problem) {
      setError(name, { type: 'file', message: problem })
      return
    }
    clearErrors(name)
    bound.onChange(next)
    onFile?.(next)
  }

  const onDrop = (event: DragEvent) => {
    event.preventDefault()
    setOver(false)
    take(event.dataTransfer.files[0])
  }

  return (
    <FieldFrame {...field} htmlFor={field.id} label={label} help={help} optional={optional}>
      {file instanceof File ? <FileRow file={file} sending={sending} /> : null}
      <div
        onDragOver={(event) => {
          event.preventDefault()
          setOver(true)
        }}
        onDragLeave={() => setOver(false)}
        onDrop={onDrop}
        className={classNames(
          'mt-2 flex flex-wrap items-center justify-center gap-3 rounded border border-dashed border-edge p-5',
          over && 'bg-wash',
        )}
      >
        <span className="text-table text-muted max-sm:hidden">Drop here</span>
        <input
          ref={input}
          id={field.id}
          type="file"
          accept={endings.join(',')}
          aria-invalid={field.error ? true : undefined}
          aria-describedby={describedBy(field, Boolean(help))}
          className="sr-only"
          tabIndex={-1}
          onChange={(event) => {
            take(event.target.files?.[0])
            event.target.value = ''
          }}
        />
        <Button look="secondary" size="small" onClick={() => input.current?.click()}>
          {file instanceof File ? 'Choose another file' : 'Choose a file'}
        </Button>
      </div>
    </FieldFrame>
  )
}
