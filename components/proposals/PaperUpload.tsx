'use client'

import { z } from 'zod'
import { SendFile } from '@/components/forms/SendFile'
import { maxPaperBytes } from '@/lib/domain/papers/limits'

export interface PaperUploadProps {
  /** Where it is sent to. */
  to: string
  kind: 'justification' | 'team-expertise'
  label: string
  help: string
}

const reply = z.object({ fileName: z.string() })

/** Takes a PDF of a proposal. */
export function PaperUpload({ to, kind, label, help }: PaperUploadProps) {
  return (
    <SendFile
      {...{ id: kind, to, label, help, reply }}
      fields={{ kind }}
      deed="looking it through"
      doneWords={({ fileName }) => `${fileName} is kept`}
      endings={['.pdf']}
      maxBytes={maxPaperBytes}
    />
  )
}
