import type { LineChartGeometry } from './geometry/lineChart'

export interface LineGuide {
  y: number
  words: string
}

export interface LineUpright {
  x: number
  words: string
}

export interface LineNote {
  x: number
  y: number
  words: string
  /** What stands there where the words have no room. */
  short?: string
}

export interface LineChartMarksProps {
  geometry: LineChartGeometry
  guides: readonly LineGuide[]
  uprights: readonly LineUpright[]
  notes: readonly LineNote[]
}

/** Width of a letter at 12 px. */
const LETTER = 6.3

/** What is pointed out on a plot, under its lines: levels and uprights in lamp, stems in ink. */
export function LineChartMarks({ geometry: { x, y }, guides, uprights, notes }: LineChartMarksProps) {
  const [, width = 0] = x.range()
  const [height = 0] = y.range()
  return (
    <>
      {guides.map((guide) => (
        <g key={guide.words}>
          <path d={`M0 ${y(guide.y)}H${width}`} stroke="var(--lamp)" strokeDasharray="4 3.6" />
          <text
            x="4"
            y={y(guide.y) - 5}
            fontSize="12"
            fontWeight="600"
            fill="var(--lamp)"
            className="ground-halo"
          >
            {guide.words}
          </text>
        </g>
      ))}
      {uprights.map((upright) => (
        <g key={upright.words} transform={`translate(${x(upright.x)} 0)`}>
          <path d={`M0 0V${height}`} stroke="var(--lamp)" />
          <text
            x="6"
            y={height - 10}
            fontSize="12.5"
            fontWeight="600"
            fill="var(--lamp)"
            className="ground-halo"
          >
            {upright.words}
          </text>
        </g>
      ))}
      {notes.map((note) => {
        const words =
          note.words.length * LETTER > width - x(note.x) - 12 ? (note.short ?? note.words) : note.words
        const left = x(note.x) + words.length * LETTER > width
        return (
          <g key={note.words} transform={`translate(${x(note.x)} ${y(note.y)})`}>
            <path d="M0 -4V-26" stroke="var(--ink-muted)" />
            <text
              x={left ? -6 : 6}
              y="-18"
              textAnchor={left ? 'end' : 'start'}
              fontSize="12"
              fill="var(--ink)"
              className="ground-halo"
            >
              {words}
            </text>
          </g>
        )
      })}
    </>
  )
}
