import { classNames } from '@/components/ui/classNames'
import type { NightElsewhere } from '@/lib/domain/calendar/nightElsewhere'
import type { CalendarNight } from '@/lib/domain/calendar/types'

interface NightCellProps {
  night: CalendarNight
  instruments: readonly { id: number; name: string }[]
  /** What other calls offer of it. */
  elsewhere: readonly NightElsewhere[]
  label: string
  chosen: boolean
  tabbable: boolean
  onChoose: (extend: boolean) => void
}

const hatched = 'repeating-linear-gradient(45deg, var(--edge) 0 1.5px, transparent 1.5px 5px)'

const looks = {
  science: 'bg-accent text-on-accent',
  engineering: 'border border-edge text-ink',
  promised: 'border border-edge bg-tint text-ink',
} as const

/** A night in the calendar: its parts from evening to morning, the initial of a mounted instrument, the Moon above. */
export function NightCell({
  night,
  instruments,
  elsewhere,
  label,
  chosen,
  tabbable,
  onChoose,
}: NightCellProps) {
  return (
    <button
      type="button"
      data-night={night.date}
      aria-label={label}
      aria-pressed={chosen}
      tabIndex={tabbable ? 0 : -1}
      onClick={(event) => onChoose(event.shiftKey)}
      className={classNames(
        'relative block h-9 w-full cursor-pointer border-0 bg-transparent px-px pt-1.5 pb-0.5',
        chosen && 'bg-lamp-wash outline-2 -outline-offset-1 outline-lamp',
      )}
    >
      <span
        aria-hidden="true"
        className="absolute inset-x-px top-0 bg-muted"
        style={{ height: `${Math.round(night.moonLit * 4)}px` }}
      />
      {elsewhere.map((one) => (
        <span
          key={one.from}
          aria-hidden="true"
          className="absolute bottom-0 z-10 h-1 bg-lamp"
          style={{ left: `${one.from * 100}%`, width: `${(one.to - one.from) * 100}%` }}
        />
      ))}
      <span aria-hidden="true" className="relative block h-full w-full border border-dashed border-rule">
        {night.parts.map((part) => (
          <span
            key={part.from}
            className={classNames(
              'absolute inset-y-0 flex items-center justify-center overflow-hidden text-[11px] leading-none font-semibold',
              looks[part.useFor],
            )}
            style={{
              left: `${part.from * 100}%`,
              width: `${(part.to - part.from) * 100}%`,
              ...(part.useFor === 'engineering' ? { background: hatched } : {}),
            }}
          >
            {instruments.find(({ id }) => id === part.instrumentId)?.name.charAt(0)}
          </span>
        ))}
      </span>
    </button>
  )
}
