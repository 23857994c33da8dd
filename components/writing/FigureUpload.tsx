'use client'

import { useState, useTransition } from 'react'
import { FormProvider, useForm } from 'react-hook-form'
import { ActionFormContext } from '@/components/forms/ActionFormContext'
import { FileField } from '@/components/forms/FileField'
import type { FileSending } from '@/components/forms/FileRow'
import { fingerprint } from '@/components/proposals/fingerprint'
import { Button } from '@/components/ui/Button'
import { showToast } from '@/components/ui/showToast'
import { maxFigureBytes } from '@/lib/domain/writings/limits'
import { formatBytes } from '@/lib/format'
import type { FigureActions } from './figureActions'

export interface FigureUploadProps {
  reference: string
  /** The figure whose picture is replaced; null for a new one. */
  figureId: number | null
  label: string
  help?: string
  upload: FigureActions['upload']
}

/** Takes a picture, chosen or dropped, and sends it at once; one that did not get through can be sent again. */
export function FigureUpload({ reference, figureId, label, help, upload }: FigureUploadProps) {
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
      setSending({ share: 0.4, words: `Sending ${formatBytes(file.size)} and drawing it anew` })
      const body = new FormData()
      const words = { reference, figureId: figureId ?? '', sha256, sizeBytes: file.size }
      for (const [name, value] of Object.entries(words)) body.set(name, String(value))
      body.set('file', file)
      const result = await upload(body)
      if (result.ok) {
        form.reset({ file: null })
        showToast(`${result.data.fileName} is kept as ${result.data.label}`)
        return
      }
      form.setError('file', { type: 'server', message: result.fieldErrors.file ?? result.message })
      if (result.kind === 'unavailable' || result.kind === 'unexpected') setLost(file)
    } catch {
      form.setError('file', {
        type: 'server',
        message: 'The picture did not get through. Nothing was changed.',
      })
      setLost(file)
    } finally {
      setSending(null)
    }
  }

  return (
    <FormProvider {...form}>
      <ActionFormContext value={{ id: `figure-${figureId ?? 'new'}`, busy: sending !== null }}>
        <FileField
          name="file"
          label={label}
          help={help}
          endings={['.png', '.jpg', '.jpeg']}
          maxBytes={maxFigureBytes}
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
