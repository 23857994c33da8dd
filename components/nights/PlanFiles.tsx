import { linkClasses } from '@/components/ui/linkClasses'
import type { PlanFileName } from '@/lib/paths'

const files: readonly [PlanFileName, string][] = [
  ['nights.csv', 'CSV by half-month and sidereal time'],
  ['obsplan.csv', 'CSV with the columns of ObsLocTAP'],
  ['nights.ics', 'calendar (.ics)'],
]

/** The night plan as files: what is given, laid into the nights. */
export function PlanFiles({ hrefOf }: { hrefOf: (file: PlanFileName) => string }) {
  return (
    <p className="m-0 flex flex-wrap items-baseline gap-x-5 gap-y-1 text-table text-muted" data-no-print>
      <span>What is given, laid into the nights:</span>
      {files.map(([file, words]) => (
        <a key={file} href={hrefOf(file)} download className={`${linkClasses} max-sm:min-h-11`}>
          {words}
        </a>
      ))}
    </p>
  )
}
