import { formatList, formatNumber } from '@/lib/format'
import { constraintRow } from '../../observations/constraintSchema'
import { observationRow } from '../../observations/observationRow'
import { groupRow } from '../../targetGroups/groupRow'
import { wishRow } from '../../wishes/wishForm'
import { targetRow } from '../../targets/targetRow'
import { cosmologyFormOf } from '../cosmologyForm'
import type { ProposalContents } from '../types'

export const thingKinds = [
  'question',
  'target',
  'group',
  'cosmology',
  'conditions',
  'observation',
  'wish',
  'person',
  'paper',
  'figure',
] as const
export type ThingKind = (typeof thingKinds)[number]

/** Something a proposal holds, as the words of its fields; texts that are read at length are compared elsewhere. */
export interface Thing {
  id: number
  name: string
  fields: Readonly<Record<string, string>>
}

const worded = (row: object): Record<string, string> =>
  Object.fromEntries(Object.entries(row).map(([name, value]) => [name, String(value ?? '')]))
const yesNo = (value: boolean) => (value ? 'yes' : 'no')

function observationsOf({ observations, targets, modes, constraintSets }: ProposalContents): Thing[] {
  return observations.map((observation) => {
    const target = targets.find(({ id }) => id === observation.targetId)?.name ?? 'a target'
    const fields = {
      ...worded(observationRow(observation)),
      targetId: target,
      feature: observation.feature ?? '',
      modeId: modes.find(({ modeId }) => modeId === observation.modeId)?.name ?? 'a mode not on offer',
      constraintSetId: constraintSets.find(({ id }) => id === observation.constraintSetId)?.name ?? '',
    }
    return { id: observation.id, name: `${target}, ${fields.modeId}`, fields }
  })
}

function groupsOf({ groups, targets }: ProposalContents): Thing[] {
  return groups.map((group) => {
    const { targetIds, ...rest } = groupRow(group, targets)
    const names = targets.filter(({ id }) => targetIds.includes(String(id))).map(({ name }) => name)
    return { id: group.id, name: group.name, fields: { ...worded(rest), targetIds: formatList(names) } }
  })
}

function wishesOf({ wishes, modes }: ProposalContents): Thing[] {
  return wishes.map((wish) => ({
    id: wish.id,
    name:
      modes.find(({ instrument }) => instrument.id === wish.instrumentId)?.instrument.name ?? 'an instrument',
    fields: worded(wishRow(wish)),
  }))
}

/** Everything a proposal holds, by kind. */
export function thingsOf(contents: ProposalContents): Record<ThingKind, Thing[]> {
  const { title, category, cosmology, targets, constraintSets, people, papers, figures } = contents
  return {
    question: [{ id: 0, name: 'The question', fields: { title, category } }],
    target: targets.map((target) => ({
      ...{ id: target.id, name: target.name },
      fields: worded(targetRow(target)),
    })),
    group: groupsOf(contents),
    cosmology: [
      {
        ...{ id: 0, name: 'The cosmology' },
        fields: { ...worded(cosmologyFormOf(cosmology)), choice: cosmology.parameters.name },
      },
    ],
    conditions: constraintSets.map((set) => ({
      ...{ id: set.id, name: set.name },
      fields: worded(constraintRow(set)),
    })),
    observation: observationsOf(contents),
    wish: wishesOf(contents),
    person: people.map((person) => ({
      ...{ id: person.id, name: person.name },
      fields: {
        ...{
          name: person.name,
          institute: person.institute,
          access: person.role === 'pi' ? 'leads' : person.access,
        },
        ...{ orcid: person.orcid ?? '', isStudent: yesNo(person.isStudent) },
        ...{ isSupervisor: yesNo(person.isSupervisor), position: formatNumber(person.position) },
      },
    })),
    paper: papers.map(({ kind, fileName, pages, sha256 }) => ({
      ...{ id: kind === 'justification' ? 1 : 2, name: kind },
      fields: { fileName, pages: formatNumber(pages), fingerprint: sha256.slice(0, 16) },
    })),
    figure: figures.map(({ id, label, caption, position, sha256 }) => ({
      ...{ id, name: label },
      fields: { label, caption, position: formatNumber(position), fingerprint: sha256.slice(0, 16) },
    })),
  }
}
