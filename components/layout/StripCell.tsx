import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'

export interface StripCellProps {
  label: string
  value: ReactNode
  /** Muted words after the value: nights, checks clear. Dropped on narrow screens. */
  trailing?: ReactNode
  /** `lamp` for what is about time. */
  tone?: 'lamp'
  /** Left out on phones, which have room for five beside the time of saving. */
  wideOnly?: boolean
  /** Shown on phones alone: what stands elsewhere on wide screens, such as when it was saved. */
  phoneOnly?: boolean
}

/** One cell of the request strip: label, value, trailing words. */
export function StripCell({
  label,
  value,
  trailing,
  tone,
  wideOnly = false,
  phoneOnly = false,
}: StripCellProps) {
  return (
    <div
      className={classNames(
        'strip-cell flex min-w-0 flex-col justify-center border-rule sm:border-l sm:px-5 sm:first:border-l-0 sm:first:pl-0 sm:max-lg:px-3',
        wideOnly && 'max-sm:hidden',
        phoneOnly && 'sm:hidden',
      )}
    >
      <dt className="text-tick leading-[1.125rem] whitespace-nowrap text-muted">{label}</dt>
      <dd
        className={classNames(
          'm-0 truncate text-strip font-semibold max-sm:leading-5 max-sm:whitespace-normal',
          tone === 'lamp' && 'text-lamp',
        )}
      >
        {value}
        {trailing ? <span className="font-normal text-muted max-strip:hidden"> · {trailing}</span> : null}
      </dd>
    </div>
  )
}
