export interface Paper {
  id: number
  kind: 'justification' | 'team-expertise'
  fileName: string
  pages: number
  sizeBytes: number
  sha256: string
  objectKey: string
  uploadedAt: Date
}

export type WritingPart = 'justification' | 'references' | 'team'

/** A text written here; version 0 when nothing was ever written. */
export interface Writing {
  text: string
  version: number
}

/** The justification (Markdown with TeX), its references (BibTeX), and the words on the team. */
export type Writings = Record<WritingPart, Writing>

export interface Figure {
  id: number
  /** What the text calls it: `[@fig:label]`. */
  label: string
  caption: string
  fileName: string
  widthPx: number
  heightPx: number
  /** From 1. */
  position: number
  version: number
  sizeBytes: number
  sha256: string
  objectKey: string
  contentType: 'image/png' | 'image/jpeg'
}
