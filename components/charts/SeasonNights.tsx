import { seasonHours, type SeasonColumn, type SeasonMonth } from './geometry/season'
import { targetShape, type SeasonTarget } from './geometry/seasonTarget'
import { SeasonDefs } from './SeasonDefs'

export interface SeasonNightsProps {
  id: string
  columns: readonly SeasonColumn[]
  months: readonly SeasonMonth[]
  target?: SeasonTarget
  width: number
  height: number
  /** Nights down and hours across, for phones. */
  turned?: boolean
}

const { from, to } = seasonHours
const round = (value: number) => Math.round(value * 10) / 10

/** The plot itself: a column a night, the Moon on it, months parted, a target's window cut out of a veil. */
export function SeasonNights({
  id,
  columns,
  months,
  target,
  width,
  height,
  turned = false,
}: SeasonNightsProps) {
  const nightStep = (turned ? height : width) / columns.length
  const hourStep = (turned ? width : height) / (to - from)
  const place = (night: number, hour: number): [number, number] => {
    const along = night * nightStep
    const up = (hour - from) * hourStep
    return turned ? [up, along] : [along, height - up]
  }
  const box = (night: number, start: number, end: number, inset: number) => {
    const [x0, y0] = place(night, start)
    const [x1, y1] = place(night + 1, end)
    return turned
      ? { x: round(x0), y: round(y0 + inset), width: round(x1 - x0), height: round(nightStep - 2 * inset) }
      : { x: round(x0 + inset), y: round(y1), width: round(nightStep - 2 * inset), height: round(y0 - y1) }
  }
  const shape = target ? targetShape(target, place) : null
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width="100%"
      height={height}
      preserveAspectRatio="none"
      className="block"
      aria-hidden="true"
      focusable="false"
    >
      <SeasonDefs id={id} columns={columns} fromHour={from} toHour={to} turned={turned} />
      {columns.map((column, night) => {
        const { x, y, width: wide, height: tall } = box(night, from, to, 0)
        // A hair of overlap: no seam between neighbours when the picture is scaled.
        const size = turned ? { width: wide, height: tall + 0.6 } : { width: wide + 0.6, height: tall }
        return <rect key={column.date} x={x} y={y} {...size} fill={`url(#${id}${night})`} />
      })}
      {columns.flatMap((column, night) =>
        column.moon.map((bar) => (
          <rect
            key={`${column.date} ${bar.from}`}
            {...box(night, Math.max(from, bar.from), Math.min(to, bar.to), nightStep * 0.14)}
            rx={Math.min(2.2, nightStep * 0.36)}
            fill="var(--moon)"
            opacity={bar.opacity}
          />
        )),
      )}
      {months.slice(1).map((month) => {
        const [x0, y0] = place(month.first, from)
        const [x1, y1] = place(month.first, to)
        return (
          <path
            key={month.name}
            d={`M${x0} ${y0}L${x1} ${y1}`}
            stroke="var(--night-text)"
            strokeOpacity="0.18"
            vectorEffect="non-scaling-stroke"
          />
        )
      })}
      {shape ? (
        <>
          <path
            d={`M0 0H${width}V${height}H0Z${shape.areas.join('')}`}
            fillRule="evenodd"
            fill="var(--veil)"
            style={{ fillOpacity: 'var(--veil-opacity)' }}
          />
          {shape.edges.map((edge) => (
            <path
              key={edge}
              d={edge}
              fill="none"
              stroke="var(--target)"
              strokeWidth="2"
              vectorEffect="non-scaling-stroke"
            />
          ))}
          <path
            d={shape.transit}
            fill="none"
            stroke="var(--target)"
            strokeWidth="1.2"
            strokeDasharray="2 5"
            vectorEffect="non-scaling-stroke"
          />
        </>
      ) : null}
    </svg>
  )
}
