import type { ReactNode } from 'react'
import { classNames } from '@/components/ui/classNames'

export interface StripCellProps {
  label: string
  value: ReactNode
  /** Muted words after the value: nights, checks clear. Dropped on narrow screens. */
  trailing?: ReactNode
  /** `lamp` for what is about time. */
  tone?: 'lamp'
  /** Left out on phones, which have room for six. */
  wideOnly?: boolean
}

/** One cell of the request strip: label, value, trailing words. */
export function StripCell({ label, value, trailing, tone, wideOnly = false }: StripCellProps) {
  return (
    <div
      className={classNames(
        'flex min-w-0 flex-col justify-center border-rule px-5 not-last:border-r first:pl-0',
        'max-lg:px-3 max-sm:min-h-15 max-sm:border-r max-sm:border-b max-sm:px-4 max-sm:first:pl-4',
        wideOnly && 'max-sm:hidden',
      )}
    >
      <dt className="text-tick leading-[1.125rem] whitespace-nowrap text-muted">{label}</dt>
      <dd className={classNames('m-0 truncate text-strip font-semibold', tone === 'lamp' && 'text-lamp')}>
        {value}
        {trailing ? <span className="font-normal text-muted max-xl:hidden"> · {trailing}</span> : null}
      </dd>
    </div>
  )
}
