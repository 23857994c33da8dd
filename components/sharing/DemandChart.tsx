import { ChartFrame } from '@/components/charts/ChartFrame'
import { DemandBar } from '@/components/charts/DemandBar'
import type { SharingView } from '@/lib/domain/sharing/sharingView'
import { countInWords, formatHoursFromSeconds, formatPercent } from '@/lib/format'

const inHours = (seconds: number) => Math.round(seconds / 36) / 100

/** What each panel asks of each telescope, as a bar, against its share, as a tick. */
export function DemandChart({ view }: { view: SharingView }) {
  const nameOf = (id: number) => view.panels.find((panel) => panel.id === id)?.name ?? ''
  const all = view.pools.flatMap((pool) => pool.panels)
  const most = Math.max(1, ...all.map((one) => Math.max(one.askedSeconds, one.shareSeconds) / 3600))
  const partOf = (seconds: number, whole: number) => (whole > 0 ? seconds / whole : 0)
  return (
    <ChartFrame
      title="Hours asked (bar) and the panel’s share (tick)"
      fileName={`shares-call-${view.callNumber}`}
      numbers={{
        caption: `Demand and shares of call ${view.callNumber}`,
        columns: [
          { head: 'Telescope' },
          { head: 'Panel' },
          { head: 'Proposals asking', decimals: 0 },
          { head: 'Asked', unit: 'h', decimals: 2 },
          { head: 'Share', unit: 'h', decimals: 2 },
          { head: 'Share of the time', unit: '%', decimals: 1 },
        ],
        rows: view.pools.flatMap((pool) =>
          pool.panels.map((one) => [
            ...[pool.name, nameOf(one.panelId), one.proposals],
            ...[inHours(one.askedSeconds), inHours(one.shareSeconds)],
            Math.round(1000 * partOf(one.shareSeconds, pool.offeredSeconds)) / 10,
          ]),
        ),
      }}
    >
      <div className="grid gap-x-16 gap-y-8 md:grid-cols-2">
        {view.pools.map((pool) => {
          const isShared = pool.panels.some((one) => one.shareSeconds > 0)
          return (
            <section key={pool.id} aria-label={pool.name}>
              <h3 className="mb-1 text-body font-semibold">
                {pool.name}{' '}
                <span className="text-table font-normal text-muted">
                  {formatHoursFromSeconds(pool.offeredSeconds)} to share
                  {pool.heldSeconds > 0 ? `, ${formatHoursFromSeconds(pool.heldSeconds)} held back` : ''}
                </span>
              </h3>
              {isShared ? null : (
                <p className="m-0 text-table text-muted">Nothing is asked of it: it is not shared.</p>
              )}
              <ul className="plain-list text-table">
                {pool.panels.map((one) => (
                  <li
                    key={one.panelId}
                    className="grid items-center gap-x-4 gap-y-1 border-t border-rule py-2 sm:grid-cols-[9rem_auto_minmax(0,1fr)]"
                  >
                    <span>{nameOf(one.panelId)}</span>
                    <DemandBar
                      askedHours={one.askedSeconds / 3600}
                      shareHours={one.shareSeconds / 3600}
                      maxHours={most}
                    />
                    <span className="text-muted">
                      <strong className="whitespace-nowrap text-ink">
                        {formatHoursFromSeconds(one.shareSeconds)},{' '}
                        {formatPercent(partOf(one.shareSeconds, pool.offeredSeconds))}
                      </strong>{' '}
                      <span className="whitespace-nowrap">
                        for {formatHoursFromSeconds(one.askedSeconds)} asked
                      </span>{' '}
                      <span className="whitespace-nowrap">
                        by {countInWords(one.proposals, 'proposal', 'proposals')}
                      </span>
                    </span>
                  </li>
                ))}
              </ul>
            </section>
          )
        })}
      </div>
    </ChartFrame>
  )
}
