import { useTableQuery } from '@/components/tables/useTableQuery'
import { tableView, type TableView } from '@/lib/domain/discussions/tableView'
import { paths } from '@/lib/paths'

/** How soon a change by someone else is seen, and a screen goes blank, ms. */
const everyMs = 3000

/** What lies on the panel's table, kept up with the others at it. */
export function useMeeting(initial: TableView): TableView {
  const { data } = useTableQuery({
    key: ['panel', 'meeting', initial.panelId],
    url: `${paths.api.table('meeting')}?call=${encodeURIComponent(initial.callSlug)}&panel=${initial.panelId}`,
    schema: tableView,
    initialData: initial,
    everyMs,
  })
  return data ?? initial
}
