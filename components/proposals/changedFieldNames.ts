import { observationCellNames } from '@/components/observations/observationCellNames'
import { cellNames } from '@/components/targets/cellNames'
import { groupLabels } from '@/components/targets/groups/groupLabels'
import { wishLabels } from '@/components/observations/wishLabels'
import { conditionLabels } from '@/components/observations/conditionLabels'
import type { ThingKind } from '@/lib/domain/proposals/history/thingsOf'
import { cosmologyLabels } from './cosmologyLabels'

/** What a thing is called before its name. */
export const thingNames: Readonly<Record<ThingKind, string>> = {
  question: '',
  target: 'Target',
  group: 'Group',
  cosmology: '',
  conditions: 'Conditions',
  observation: 'Observation',
  wish: 'Wishes for',
  person: '',
  paper: '',
  figure: 'Figure',
}

/** What each field is called where two versions are compared. */
export const changedFieldNames: Readonly<Record<ThingKind, Readonly<Record<string, string>>>> = {
  question: { title: 'Title', category: 'Category' },
  target: cellNames,
  group: groupLabels,
  cosmology: cosmologyLabels,
  conditions: conditionLabels,
  observation: observationCellNames,
  wish: wishLabels,
  person: {
    name: 'Name',
    institute: 'Institute',
    access: 'Right',
    orcid: 'ORCID iD',
    isStudent: 'A student',
    isSupervisor: 'Supervises the student',
    position: 'Place in the list',
  },
  paper: { fileName: 'File', pages: 'Pages', fingerprint: 'Fingerprint' },
  figure: {
    label: 'Label',
    caption: 'Caption',
    position: 'Place',
    fingerprint: 'Fingerprint of the picture',
  },
}
