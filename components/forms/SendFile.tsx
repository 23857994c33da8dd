'use client'

import type { ReactNode } from 'react'
import { FormProvider, useForm } from 'react-hook-form'
import type { z } from 'zod'
import { showToast } from '@/components/ui/showToast'
import { ActionFormContext } from './ActionFormContext'
import { FileField } from './FileField'
import type { FileRules } from './fileProblem'
import { SendAgain } from './SendAgain'
import { useFileJourney } from './useFileJourney'

export interface SendFileProps<Data> extends FileRules {
  id: string
  label: ReactNode
  help?: string
  /** Where it is sent to. */
  to: string
  /** What goes with the file. */
  fields: Readonly<Record<string, string | number>>
  /** What is done to it there: `looking it through`. */
  deed: string
  /** What is answered once it is kept. */
  reply: z.ZodType<Data>
  doneWords: (data: Data) => string
}

/**
 * Takes a file, chosen or dropped, and sends it at once, saying how much of it has gone. It can be stopped; one that
 * did not get through is kept to be sent again; what is wrong with it stands at the field.
 */
export function SendFile<Data>(props: SendFileProps<Data>) {
  const { id, label, help, endings, maxBytes, to, fields, deed, reply, doneWords } = props
  const form = useForm<{ file: File | null }>({ defaultValues: { file: null } })
  const { sending, waiting, send, sendAgain } = useFileJourney<Data>({
    ...{ to, fields, deed, reply },
    onKept: (data) => {
      form.reset({ file: null })
      showToast(doneWords(data))
    },
    onRefused: (message) => form.setError('file', { type: 'server', message }),
  })
  return (
    <FormProvider {...form}>
      <ActionFormContext value={{ id, busy: sending !== null }}>
        <FileField
          name="file"
          {...{ label, help, endings, maxBytes, sending }}
          onFile={(file) => void send(file)}
        />
        <p role="status" className="sr-only">
          {sending?.spoken}
        </p>
        {waiting ? <SendAgain waiting={waiting} onSend={sendAgain} /> : null}
      </ActionFormContext>
    </FormProvider>
  )
}
