'use client'

import { z } from 'zod'
import { SendFile } from '@/components/forms/SendFile'
import { maxFigureBytes } from '@/lib/domain/writings/limits'
import { paths } from '@/lib/paths'

const reply = z.object({ fileName: z.string(), label: z.string() })

export interface FigureUploadProps {
  reference: string
  /** The figure whose picture is replaced; null for a new one. */
  figureId: number | null
  label: string
  help?: string
}

/** Takes a picture of the justification. */
export function FigureUpload({ reference, figureId, label, help }: FigureUploadProps) {
  return (
    <SendFile
      {...{ label, help, reply }}
      id={`figure-${figureId ?? 'new'}`}
      to={paths.newFigure(reference)}
      fields={{ figureId: figureId ?? '' }}
      deed="drawing it anew"
      doneWords={(kept) => `${kept.fileName} is kept as ${kept.label}`}
      endings={['.png', '.jpg', '.jpeg']}
      maxBytes={maxFigureBytes}
    />
  )
}
