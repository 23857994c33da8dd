import { ChanceBar } from '@/components/charts/ChanceBar'
import { HoursBar } from '@/components/charts/HoursBar'
import { RankInterval } from '@/components/charts/RankInterval'
import { SignEntry } from './SignEntry'

/** The marks of the panel's pages, on an invented proposal. */
export function PanelMarks() {
  return (
    <>
      <SignEntry
        sign={
          <div className="-my-2 overflow-hidden">
            <RankInterval
              width={190}
              count={24}
              line={12}
              zone={[9, 18]}
              grey
              merit={13}
              raw={12}
              low={9}
              high={20}
              lowerHalf={11}
              upperHalf={16}
            />
          </div>
        }
      >
        Where a rank could lie: thin line nine draws in ten, thick bar the middle half, short tick the rank by
        merit, tall one the rank by plain mean. The dashed line is the line; around it lies the zone where
        scores do not decide.
      </SignEntry>
      <SignEntry sign={<ChanceBar chance={0.27} grey />}>
        The chance to belong above the line; the tick is one half. Lit between 0.2 and 0.8: to be discussed.
      </SignEntry>
      <SignEntry sign={<HoursBar asked={54} given={34.5} least={30} maxHours={60} width={150} />}>
        Hours asked as the outline, hours given as the fill, the least that is still of use as the tick.
      </SignEntry>
    </>
  )
}
