import { verdictGlyphPath, type VerdictShape } from './verdictGlyphPath'

export interface VerdictGlyphProps {
  shape: VerdictShape
  /** 12 in text, 10 in chips, 16 by a heading. */
  height?: 10 | 12 | 16
}

/** The sign alone; it always stands with its word, so screen readers skip it. */
export function VerdictGlyph({ shape, height = 12 }: VerdictGlyphProps) {
  return (
    <svg
      viewBox="0 0 16 12"
      width={(height * 16) / 12}
      height={height}
      className="inline-block shrink-0"
      aria-hidden="true"
      focusable="false"
    >
      <path d={verdictGlyphPath(shape)} fill="currentColor" />
    </svg>
  )
}
