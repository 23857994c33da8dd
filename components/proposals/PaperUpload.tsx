'use client'

import { SendFile } from '@/components/forms/SendFile'
import type { ActionResult } from '@/lib/actions/result'
import { maxPaperBytes } from '@/lib/domain/papers/limits'
import type { UploadedPaper } from '@/lib/domain/papers/uploadPaper'

export interface PaperUploadProps {
  reference: string
  kind: 'justification' | 'team-expertise'
  label: string
  help: string
  upload: (form: FormData) => Promise<ActionResult<UploadedPaper>>
}

const words = {
  deed: 'looking it through',
  lostWords: 'The file did not get through. Nothing was changed.',
  doneWords: ({ fileName }: UploadedPaper) => `${fileName} is kept`,
}

/** Takes a PDF of a proposal. */
export function PaperUpload({ reference, kind, label, help, upload }: PaperUploadProps) {
  return (
    <SendFile
      {...words}
      {...{ id: kind, label, help, upload }}
      fields={{ reference, kind }}
      endings={['.pdf']}
      maxBytes={maxPaperBytes}
    />
  )
}
