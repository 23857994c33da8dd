import type { SeasonColumn } from './geometry/season'

export interface SeasonDefsProps {
  id: string
  columns: readonly SeasonColumn[]
  fromHour: number
  toHour: number
  turned: boolean
}

const percent = (share: number) => `${Math.round(share * 1000) / 10}%`

/** One gradient a night; by user space of the unit box, so that a column only says which one it is. */
export function SeasonDefs({ id, columns, fromHour, toHour, turned }: SeasonDefsProps) {
  const direction = turned ? { x1: 0, x2: 1, y1: 0, y2: 0 } : { x1: 0, x2: 0, y1: 1, y2: 0 }
  return (
    <defs>
      {columns.map((column, index) => (
        <linearGradient key={column.date} id={`${id}${index}`} {...direction}>
          {column.stops.map((stop) => (
            <stop
              key={stop.hour}
              offset={percent((stop.hour - fromHour) / (toHour - fromHour))}
              stopColor={stop.colour}
            />
          ))}
        </linearGradient>
      ))}
    </defs>
  )
}
