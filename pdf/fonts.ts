import { join } from 'node:path'
import { Font } from '@react-pdf/renderer'

// woff2 is refused by the renderer. A glyph that no font has would print as another one without an error.
const folder = join(process.cwd(), 'node_modules', '@fontsource')
const file = (font: string, subset: string, weight: number, slope = 'normal') =>
  join(folder, font, 'files', `${font}-${subset}-${weight}-${slope}.woff`)

const families = [
  ['Work Sans', 'work-sans', 'latin', 600],
  ['Work Sans Ext', 'work-sans', 'latin-ext', 600],
  ['Work Sans Vietnamese', 'work-sans', 'vietnamese', 600],
  ['Noto Sans Greek', 'noto-sans', 'greek', 600],
  ['Noto Sans Cyrillic', 'noto-sans', 'cyrillic', 600],
  // Shipped in one weight.
  ['Noto Sans Math', 'noto-sans-math', 'latin', 400],
] as const

const weights = [400, 600] as const
const slopes = ['normal', 'italic'] as const

/** Only letters have an italic; signs stand upright in it, as they would in print. */
const slopeOf = (family: string, slope: 'normal' | 'italic') =>
  family === 'Work Sans' || family === 'Work Sans Ext' ? slope : 'normal'

/** Families in the order a glyph is looked for. */
export const fontFamily: string[] = families.map(([name]) => name)

/**
 * Reads a font and looks every character up once. A glyph met first as a part of another (the prime in a double
 * prime) would be remembered without its character, and could not be copied or searched in any later document.
 */
async function readFont(family: string, fontWeight: number, fontStyle: 'normal' | 'italic'): Promise<void> {
  const which = { fontFamily: family, fontWeight, fontStyle }
  await Font.load(which)
  const { data } = Font.getFont(which)
  if (!data || !('characterSet' in data)) throw new Error(`the font ${family} could not be read`)
  for (const codePoint of data.characterSet) data.glyphForCodePoint(codePoint)
}

let ready: Promise<void> | null = null

/** Registers and reads the fonts, once in a process. */
export function loadFonts(): Promise<void> {
  ready ??= (async () => {
    for (const [family, font, subset, bold] of families)
      Font.register({
        family,
        fonts: slopes.flatMap((fontStyle) =>
          weights.map((fontWeight) => ({
            src: file(font, subset, fontWeight === 600 ? bold : 400, slopeOf(family, fontStyle)),
            fontWeight,
            fontStyle,
          })),
        ),
      })
    // Words are not broken: names of objects must stay readable.
    Font.registerHyphenationCallback((word) => [word])
    for (const family of fontFamily)
      for (const weight of weights) for (const slope of slopes) await readFont(family, weight, slope)
  })()
  return ready
}

const known = new Map<number, boolean>()

/** Whether any of the fonts has a character; only after `loadFonts`. */
export function canPrint(codePoint: number): boolean {
  const kept = known.get(codePoint)
  if (kept !== undefined) return kept
  const found = fontFamily.some((family) => {
    const data = Font.getFont({ fontFamily: family, fontWeight: 400 })?.data
    return data && 'hasGlyphForCodePoint' in data ? data.hasGlyphForCodePoint(codePoint) : false
  })
  known.set(codePoint, found)
  return found
}

/** How far a character rises above the baseline in the font it is printed with, em; only after `loadFonts`. */
export function ascentEm(codePoint: number): number {
  for (const family of fontFamily) {
    const data = Font.getFont({ fontFamily: family, fontWeight: 400 })?.data
    if (data && 'hasGlyphForCodePoint' in data && data.hasGlyphForCodePoint(codePoint))
      return data.ascent / data.unitsPerEm
  }
  return 1
}
