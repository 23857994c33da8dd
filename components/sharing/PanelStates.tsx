import { Facts } from '@/components/ui/Facts'
import type { SharingView } from '@/lib/domain/sharing/sharingView'
import { countInWords } from '@/lib/format'

type PanelOfCall = SharingView['panels'][number]

function stateOf({ list, listVersion, proposals }: PanelOfCall): string {
  if (proposals === 0) return 'no proposal'
  if (list === 'none') return 'not ranked yet'
  return list === 'open' ? `version ${listVersion}, open` : `version ${listVersion}, frozen`
}

/** Where the list of each panel stands. */
export function PanelStates({ view }: { view: SharingView }) {
  return (
    <Facts
      title="The panels’ lists"
      facts={view.panels.map((panel) => ({
        term: panel.name,
        value: (
          <>
            {stateOf(panel)}
            {panel.proposals > 0 ? (
              <span className="block text-caption text-muted">
                {countInWords(panel.proposals, 'proposal', 'proposals')}
              </span>
            ) : null}
          </>
        ),
      }))}
    />
  )
}
