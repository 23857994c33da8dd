'use client'

import { ChartFrame } from '@/components/charts/ChartFrame'
import { cellHeight, nightsGrid, type GridBin } from '@/components/charts/geometry/nightsGrid'
import { useMeasuredWidth } from '@/components/charts/useMeasuredWidth'
import type { NightsView } from '@/lib/domain/decisions/nightsView'
import { formatNumber } from '@/lib/format'

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']
const left = 30
const top = 20
const colours: Record<GridBin['moon'], string> = {
  dark: 'var(--moon-dark)',
  grey: 'var(--moon-grey)',
  bright: 'var(--moon-bright)',
}
const hour = (siderealFromH: number) => String(siderealFromH).padStart(2, '0')

/** Every half-month from the first with nights to the last: `2027-07` and which half. */
function halvesBetween(bins: readonly GridBin[], first: string): { month: string; half: 1 | 2 }[] {
  const count = Math.max(0, ...bins.map(({ half }) => half)) + 1
  const [year, month, half] = [Number(first.slice(0, 4)), Number(first.slice(5, 7)), Number(first.slice(8))]
  return Array.from({ length: count }, (_, i) => {
    const at = 2 * (12 * year + month - 1) + (half < 16 ? 0 : 1) + i
    const index = Math.floor(at / 2)
    return {
      month: `${Math.floor(index / 12)}-${String((index % 12) + 1).padStart(2, '0')}`,
      half: at % 2 === 0 ? 1 : 2,
    }
  })
}

/** The nights of a telescope by half-month, sidereal time and moonlight, filled as far as the suggestion uses them. */
export function SeasonCells({
  telescope,
  seasonFrom,
}: {
  telescope: NightsView['telescopes'][number]
  seasonFrom: string
}) {
  const { name, bins } = telescope
  const halves = halvesBetween(bins, seasonFrom)
  const { element, width } = useMeasuredWidth<HTMLDivElement>(560, true)
  const plot = width - left
  const grid = nightsGrid(bins, halves.length, plot)
  const monthName = (index: number) => months[Number(halves[index]?.month.slice(5)) - 1] ?? ''
  const used = bins.reduce((sum, bin) => sum + bin.usedSeconds, 0) / 3600
  const offered = bins.reduce((sum, bin) => sum + bin.seconds, 0) / 3600
  const words = `${name}: the suggestion uses ${formatNumber(used, 1)} of ${formatNumber(offered, 1)} hours.`
  return (
    <ChartFrame
      brief
      title={`${formatNumber(used, 1)} of ${formatNumber(offered, 1)} h suggested`}
      fileName={`nights-${name.toLowerCase()}`}
      numbers={{
        caption: `Hours of ${name} by half-month, sidereal time and moonlight`,
        columns: [
          { head: 'Half-month' },
          { head: 'Sidereal from', unit: 'h', decimals: 0 },
          { head: 'Moonlight' },
          { head: 'On offer', unit: 'h', decimals: 2 },
          { head: 'Suggested', unit: 'h', decimals: 2 },
        ],
        rows: bins.map((bin) => [
          `${halves[bin.half]?.month ?? ''}, ${halves[bin.half]?.half === 1 ? 'first' : 'second'}`,
          bin.siderealFromH,
          bin.moon,
          bin.seconds / 3600,
          bin.usedSeconds / 3600,
        ]),
      }}
    >
      <div ref={element}>
        <svg
          role="img"
          aria-label={words}
          width={width}
          height={grid.height + top}
          className="block max-w-full"
        >
          {halves.map(({ month }, index) =>
            month === halves[index - 1]?.month ? null : (
              <g key={month}>
                <path
                  d={`M${left + (index * plot) / halves.length - 1.2} ${top}V${grid.height + top}`}
                  stroke="var(--rule)"
                />
                <text x={left + (index * plot) / halves.length} y={13} fontSize="12" fill="var(--ink-muted)">
                  {monthName(index)}
                </text>
              </g>
            ),
          )}
          {grid.rows.map(({ siderealFromH, y }, index) =>
            index % 2 === 0 ? (
              <text
                key={siderealFromH}
                x={left - 8}
                y={top + y + 15}
                textAnchor="end"
                fontSize="11"
                fill="var(--ink-muted)"
              >
                {hour(siderealFromH)}
              </text>
            ) : null,
          )}
          {grid.cells.map((cell) => (
            <g key={`${cell.half}-${cell.siderealFromH}`} transform={`translate(${left} ${top + cell.y})`}>
              {cell.parts.map(({ moon, x, width: wide, used: filled }) => (
                <g key={moon}>
                  <rect
                    x={x + 0.5}
                    y={0.5}
                    width={Math.max(0.5, wide - 1)}
                    height={cellHeight - 1}
                    fill="var(--surface)"
                    stroke="var(--edge)"
                    strokeWidth="0.8"
                  />
                  {filled > 0.3 ? (
                    <rect x={x} y={0} width={filled} height={cellHeight} fill={colours[moon]} />
                  ) : null}
                </g>
              ))}
            </g>
          ))}
        </svg>
      </div>
    </ChartFrame>
  )
}
