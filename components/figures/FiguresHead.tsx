import { KeyFigure } from '@/components/ui/KeyFigure'
import type { CallFigures } from '@/lib/domain/figures/types'
import { ABSENT, formatHoursFromSeconds, formatMoneyShort, formatNumber } from '@/lib/format'
import { timesOver } from './timesOver'

/** What a call comes to, in five numbers; fees only where there are any. */
export function FiguresHead({ calls, fees }: Pick<CallFigures, 'calls' | 'fees'>) {
  const [own] = calls
  if (!own) return null
  const times = timesOver(own)
  return (
    <div className="flex flex-wrap gap-x-12 gap-y-5">
      <KeyFigure value={formatNumber(own.proposals, 0)} label="proposals sent" />
      <KeyFigure value={formatHoursFromSeconds(own.askedSeconds)} label="asked" />
      <KeyFigure
        value={times === null ? ABSENT : `${formatNumber(times, 2)}×`}
        label={`the ${formatHoursFromSeconds(own.offeredSeconds)} on offer`}
      />
      {fees ? (
        <>
          <KeyFigure
            value={formatMoneyShort(fees.paidMinor, fees.currency)}
            label={`paid of ${formatMoneyShort(fees.billedMinor, fees.currency)} billed`}
          />
          <KeyFigure
            value={formatMoneyShort(fees.owedMinor, fees.currency)}
            label={`owed; ${formatMoneyShort(fees.waivedMinor, fees.currency)} waived`}
          />
        </>
      ) : null}
    </div>
  )
}
