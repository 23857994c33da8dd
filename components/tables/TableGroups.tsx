import type { ReactNode } from 'react'
import { seriesDashes, type SeriesTone } from '@/components/charts/geometry/chartTypes'

export interface TableGroup {
  name: ReactNode
  span: number
  /** The line its columns stand under; none over columns that belong to no series. */
  tone?: SeriesTone
}

/** Over the heads: neighbouring columns under one name, ruled with the line of their series. */
export function TableGroups({ groups }: { groups: readonly TableGroup[] }) {
  return (
    <tr role="row" className="is-groups">
      {groups.map(({ name, span, tone }, index) =>
        tone ? (
          <th key={index} role="columnheader" scope="colgroup" colSpan={span}>
            <svg className="block w-0 min-w-full" height="3" aria-hidden="true" focusable="false">
              <line
                x1="0"
                x2="100%"
                y1="1.5"
                y2="1.5"
                stroke={`var(--${tone})`}
                strokeWidth="3"
                strokeDasharray={seriesDashes[tone]}
              />
            </svg>
            <span className="block pt-2" style={{ color: `var(--${tone})` }}>
              {name}
            </span>
          </th>
        ) : (
          <td key={index} role="cell" colSpan={span} />
        ),
      )}
    </tr>
  )
}
