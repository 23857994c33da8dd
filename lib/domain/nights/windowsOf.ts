import { moonClassLimits } from '@/lib/science/feasibility'
import { conditionsOf } from '../observations/seasonOf'
import type { ReportContents } from '../observations/reportContents'
import { moonClass } from '../observations/scienceRecords'
import { seasonVisibility } from '../observations/seasonVisibility'
import { skyTargetOf } from '../observations/skyTargetOf'

type Asked = ReportContents['observations'][number]

/** Times in which an observation may be made, as evening to moments in milliseconds; null without a position. */
export function windowsOf(
  contents: ReportContents,
  observation: Asked,
): Map<string, [number, number][]> | null {
  const target = contents.targets.find(({ id }) => id === observation.targetId)
  const sky = target && skyTargetOf(target)
  if (!sky) return null
  const mode = contents.modes.find(({ modeId }) => modeId === observation.modeId)
  const { maxAirmass, moon, minMoonSeparationDeg, dateFrom, dateTo } = conditionsOf(contents, observation)
  const { nights, byTarget } = seasonVisibility(
    contents.site,
    {
      from: contents.call.seasonFrom,
      to: contents.call.seasonTo,
      maxAirmass,
      twilightLimitDeg: mode?.twilightLimitDeg,
      telescope: mode?.telescope,
      moon: { ...moonClassLimits[moonClass(moon)], minSeparationDeg: minMoonSeparationDeg },
    },
    [sky],
  )
  const windows = byTarget.get(sky.id)?.windows ?? []
  return new Map(
    nights.flatMap(({ date }, index) =>
      (dateFrom && date < dateFrom) || (dateTo && date > dateTo)
        ? []
        : [[date, (windows[index] ?? []).map(([from, to]): [number, number] => [+from, +to])]],
    ),
  )
}
