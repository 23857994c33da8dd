'use client'

import { useState, useTransition, type ReactNode } from 'react'
import { FormProvider, useForm } from 'react-hook-form'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { formatBytes } from '@/lib/format'
import { ActionFormContext } from './ActionFormContext'
import { FileField } from './FileField'
import type { FileRules } from './fileProblem'
import type { FileSending } from './FileRow'
import { fingerprint } from './fingerprint'

export interface SendFileProps<Data> extends FileRules {
  id: string
  label: ReactNode
  help?: string
  /** What goes with the file. */
  fields: Readonly<Record<string, string | number>>
  /** What is done to it there: `looking it through`. */
  deed: string
  /** Said when it never arrived. */
  lostWords: string
  upload: (form: FormData) => Promise<ActionResult<Data>>
  doneWords: (data: Data) => string
}

/**
 * Takes a file, chosen or dropped, and sends it at once; what is wrong with it stands at the field, and one that did
 * not get through can be sent again.
 */
export function SendFile<Data>(props: SendFileProps<Data>) {
  const { id, label, help, endings, maxBytes, fields, deed, lostWords, upload, doneWords } = props
  const form = useForm<{ file: File | null }>({ defaultValues: { file: null } })
  const [sending, setSending] = useState<FileSending | null>(null)
  const [lost, setLost] = useState<File | null>(null)
  const [, startTransition] = useTransition()
  const fail = (message: string) => form.setError('file', { type: 'server', message })

  const send = async (file: File) => {
    setLost(null)
    form.clearErrors('file')
    try {
      setSending({ share: 0.1, words: 'Taking its fingerprint' })
      const sha256 = await fingerprint(file)
      setSending({ share: 0.4, words: `Sending ${formatBytes(file.size)} and ${deed}` })
      const body = new FormData()
      for (const [name, value] of Object.entries({ ...fields, sha256, sizeBytes: file.size }))
        body.set(name, String(value))
      body.set('file', file)
      const result = await upload(body)
      if (result.ok) {
        form.reset({ file: null })
        showToast(doneWords(result.data))
        return
      }
      fail(result.fieldErrors.file ?? result.message)
      if (result.kind === 'unavailable' || result.kind === 'unexpected') setLost(file)
    } catch {
      fail(lostWords)
      setLost(file)
    } finally {
      setSending(null)
    }
  }

  return (
    <FormProvider {...form}>
      <ActionFormContext value={{ id, busy: sending !== null }}>
        <FileField
          name="file"
          {...{ label, help, endings, maxBytes, sending }}
          onFile={(file) => startTransition(() => send(file))}
        />
        {lost ? (
          <p className="m-0 mt-2">
            <Button look="secondary" size="small" onClick={() => startTransition(() => send(lost))}>
              Send it again
            </Button>
          </p>
        ) : null}
      </ActionFormContext>
    </FormProvider>
  )
}
