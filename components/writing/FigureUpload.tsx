'use client'

import { SendFile } from '@/components/forms/SendFile'
import { maxFigureBytes } from '@/lib/domain/writings/limits'
import type { FigureActions } from './figureActions'

export interface FigureUploadProps {
  reference: string
  /** The figure whose picture is replaced; null for a new one. */
  figureId: number | null
  label: string
  help?: string
  upload: FigureActions['upload']
}

/** Takes a picture of the justification. */
export function FigureUpload({ reference, figureId, label, help, upload }: FigureUploadProps) {
  return (
    <SendFile
      {...{ label, help, upload }}
      id={`figure-${figureId ?? 'new'}`}
      fields={{ reference, figureId: figureId ?? '' }}
      deed="drawing it anew"
      lostWords="The picture did not get through. Nothing was changed."
      doneWords={(kept) => `${kept.fileName} is kept as ${kept.label}`}
      endings={['.png', '.jpg', '.jpeg']}
      maxBytes={maxFigureBytes}
    />
  )
}
