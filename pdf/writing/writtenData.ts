import type { Reference } from '@/lib/writing/references'

export interface PrintedFigure {
  label: string
  /** Markdown with TeX. */
  caption: string
  sha256: string
  widthPx: number
  heightPx: number
}

/** A text written here, as it goes into print. */
export interface WrittenData {
  /** Markdown with TeX. */
  text: string
  references: readonly Reference[]
  figures: readonly PrintedFigure[]
}
