'use client'

import { useState, useTransition } from 'react'
import { FormProvider, useForm } from 'react-hook-form'
import { ActionFormContext } from '@/components/forms/ActionFormContext'
import { FileField } from '@/components/forms/FileField'
import type { FileSending } from '@/components/forms/FileRow'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import type { ActionResult } from '@/lib/actions/result'
import { maxPaperBytes } from '@/lib/domain/papers/limits'
import type { UploadedPaper } from '@/lib/domain/papers/uploadPaper'
import { formatBytes } from '@/lib/format'
import { fingerprint } from './fingerprint'

export interface PaperUploadProps {
  reference: string
  kind: 'justification' | 'team-expertise'
  label: string
  help: string
  upload: (form: FormData) => Promise<ActionResult<UploadedPaper>>
}

/**
 * Takes a PDF, chosen or dropped, and sends it at once; what is wrong with it stands at the field, and one that did not
 * get through can be sent again.
 */
export function PaperUpload({ reference, kind, label, help, upload }: PaperUploadProps) {
  const form = useForm<{ file: File | null }>({ defaultValues: { file: null } })
  const [sending, setSending] = useState<FileSending | null>(null)
  const [lost, setLost] = useState<File | null>(null)
  const [, startTransition] = useTransition()

  const send = async (file: File) => {
    setLost(null)
    form.clearErrors('file')
    try {
      setSending({ share: 0.1, words: 'Taking its fingerprint' })
      const sha256 = await fingerprint(file)
      setSending({ share: 0.4, words: `Sending ${formatBytes(file.size)} and looking it through` })
      const body = new FormData()
      for (const [name, value] of Object.entries({ reference, kind, sha256, sizeBytes: String(file.size) }))
        body.set(name, value)
      body.set('file', file)
      const result = await upload(body)
      if (result.ok) {
        form.reset({ file: null })
        showToast(`${result.data.fileName} is kept`)
        return
      }
      form.setError('file', { type: 'server', message: result.fieldErrors.file ?? result.message })
      if (result.kind === 'unavailable' || result.kind === 'unexpected') setLost(file)
    } catch {
      form.setError('file', {
        type: 'server',
        message: 'The file did not get through. Nothing was changed.',
      })
      setLost(file)
    } finally {
      setSending(null)
    }
  }

  return (
    <FormProvider {...form}>
      <ActionFormContext value={{ id: kind, busy: sending !== null }}>
        <FileField
          name="file"
          label={label}
          help={help}
          endings={['.pdf']}
          maxBytes={maxPaperBytes}
          sending={sending}
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
