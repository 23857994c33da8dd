import type { Database } from '@/db/client'
import { callKinds, findCall } from '@/db/queries/calls'
import { modeRecordsOnOffer, siteRecordAt } from '@/db/queries/facility'
import { constraintSetsOf, observationsOf } from '@/db/queries/observations'
import { papersOf } from '@/db/queries/papers'
import { figuresOf } from '@/db/queries/figures'
import { investigatorsOf } from '@/db/queries/proposalPeople'
import { findProposal } from '@/db/queries/proposals'
import { groupsOf } from '@/db/queries/targetGroups'
import { targetsOf } from '@/db/queries/targets'
import { wishesOf } from '@/db/queries/wishes'
import { writingsOf } from '@/db/queries/writings'
import type { ProposalsRow } from '@/db/tables'
import { refuse } from '@/lib/errors'
import { cosmologySchema } from './cosmologySchema'
import type { ChosenCosmology, ProposalContents } from './types'

/** The cosmology as stored with a proposal; a row that does not parse is a fault, not a default. */
export function chosenCosmology(row: ProposalsRow): ChosenCosmology {
  return {
    id: row.cosmology_id,
    parameters: cosmologySchema.parse(JSON.parse(row.cosmology_parameters)),
    comparisonId: row.comparison_cosmology_id,
  }
}

/**
 * Everything a proposal says, by public reference or key. It checks no right: the caller asks a policy,
 * with these very contents as its subject.
 */
export async function readContents(db: Database, which: string | number): Promise<ProposalContents> {
  const row = await findProposal(db, which)
  if (!row) throw refuse.notFound('proposal')
  return contentsOf(db, row)
}

/** The contents of a row already read, locked or not. */
export async function contentsOf(db: Database, row: ProposalsRow): Promise<ProposalContents> {
  const [call, kinds] = await Promise.all([findCall(db, row.call_id), callKinds(db, row.call_id)])
  const kind = kinds.find(({ id }) => id === row.call_kind_id)
  if (!call || !kind) throw refuse.integrity('The call of this proposal is not complete.')
  const [
    site,
    modes,
    people,
    groups,
    targets,
    constraintSets,
    observations,
    wishes,
    papers,
    writings,
    figures,
  ] = await Promise.all([
    siteRecordAt(db, call.siteId, call.seasonFrom),
    modeRecordsOnOffer(db, call.id, call.seasonFrom),
    investigatorsOf(db, row.id),
    groupsOf(db, row.id),
    targetsOf(db, row.id),
    constraintSetsOf(db, row.id),
    observationsOf(db, row.id),
    wishesOf(db, row.id),
    papersOf(db, row.id),
    writingsOf(db, row.id),
    figuresOf(db, row.id),
  ])
  return {
    id: row.id,
    reference: row.reference,
    reviewNumber: row.review_number,
    state: row.state,
    isReopened: row.is_reopened === 1,
    version: row.version,
    updatedAt: row.updated_at,
    closesAt: row.closes_at,
    title: row.title,
    abstract: row.abstract,
    category: row.category,
    cosmology: chosenCosmology(row),
    sectionsDone: JSON.parse(row.sections_done) as string[],
    call,
    kind,
    site,
    modes,
    people,
    groups,
    targets,
    constraintSets,
    observations,
    wishes,
    papers,
    writings,
    figures,
  }
}
