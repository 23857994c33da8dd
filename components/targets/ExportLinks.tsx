'use client'

import { saveText } from '@/components/tables/saveText'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { targetsCsv, targetsEcsv, targetsVotable, type Exported } from '@/lib/domain/targets/rules'

const formats = [
  { name: 'CSV', ending: 'csv', type: 'text/csv;charset=utf-8', write: targetsCsv },
  { name: 'ECSV', ending: 'ecsv', type: 'text/plain;charset=utf-8', write: targetsEcsv },
  { name: 'VOTable', ending: 'vot', type: 'application/x-votable+xml', write: targetsVotable },
]

/** The targets as files to keep; each can be read here again. */
export function ExportLinks({ exported }: { exported: Exported }) {
  return formats.map(({ name, ending, type, write }) => (
    <LinkLikeButton
      key={name}
      aria-label={`Save the targets as ${name}`}
      onClick={() => saveText(`targets-${exported.reference}.${ending}`, write(exported), type)}
    >
      {name}
    </LinkLikeButton>
  ))
}
