import { countInWords } from '@/lib/format'
import { readBandChoice } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'

/** The cells a pasted block runs through, from left to right as they stand in the table. */
const across = ['name', 'ra', 'dec', 'redshift', 'magnitude', 'band'] as const
export type PastedCell = Exclude<(typeof across)[number], 'band'>

export type SpreadCells = { ok: true; lines: Partial<TargetRow>[] } | { ok: false; message: string }

/** More than one cell, as a spreadsheet copies them: cells parted by tabs, rows by line ends. */
export const isBlock = (text: string): boolean => /[\t\n\r]/.test(text.replace(/[\r\n]+$/, ''))

/**
 * A block of cells as what each of its lines types, beginning at one cell of the table. Refuses a block that is wider
 * than what stands at the right of that cell.
 */
export function spreadCells(text: string, from: PastedCell): SpreadCells {
  const lines = text
    .replace(/\r\n?/g, '\n')
    .replace(/\n+$/, '')
    .split('\n')
    .map((line) => line.split('\t').map((cell) => cell.trim()))
  const room = across.slice(across.indexOf(from))
  const wide = Math.max(...lines.map((line) => line.length))
  const isBand = (cell: string | undefined) => !cell || readBandChoice(cell) !== null
  const fits = wide <= room.length && (wide < room.length || lines.every((line) => isBand(line[wide - 1])))
  if (!fits)
    return {
      ok: false,
      message: `The block is ${countInWords(wide, 'column')} wide, and from here ${countInWords(room.length - 1, 'column', 'columns')} and a band fit. Nothing was changed; a whole table can be read below the targets.`,
    }
  return {
    ok: true,
    lines: lines.map((line) =>
      Object.fromEntries(
        line.flatMap((cell, index) => {
          const name = room[index]
          // An empty band says nothing, as each magnitude has one.
          return name && !(name === 'band' && cell === '') ? [[name, cell]] : []
        }),
      ),
    ),
  }
}
