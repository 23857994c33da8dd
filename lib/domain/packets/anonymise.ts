import type { Call } from '../calls/types'
import type { ModeRecord, SiteRecord } from '../facility/types'
import type { ProposalComputation } from '../observations/types'
import type { ChosenCosmology, ConstraintSet, Observation, Target, TargetGroup } from '../proposals/types'
import type { Snapshot } from '../submission/snapshot'

/**
 * What reviewers, the panel and instrument scientists read of a proposal: no people, no institutes, no
 * public reference, no file names, no moment of arrival. Built field by field, so that a field added to a
 * proposal stays hidden until someone decides otherwise.
 */
export interface AnonymousProposal {
  /** Call and three digits; null for a draft that was never sent. */
  reviewNumber: string | null
  call: Pick<Call, 'id' | 'number' | 'slug' | 'title' | 'seasonFrom' | 'seasonTo'>
  kind: { title: string; pageLimit: number }
  title: string
  abstract: string
  category: string
  cosmology: ChosenCosmology
  site: SiteRecord
  /** The modes the observations use. */
  modes: ModeRecord[]
  groups: TargetGroup[]
  targets: Target[]
  constraintSets: ConstraintSet[]
  observations: Observation[]
  /** Pages of the justification; null when none is attached. */
  justification: { pages: number } | null
  computation: ProposalComputation
  engineVersion: string
}

/** The projection of a snapshot that carries no identity. */
export function anonymise({ contents, computation, engineVersion }: Snapshot): AnonymousProposal {
  const used = new Set(contents.observations.map((observation) => observation.modeId))
  const justification = contents.papers.find((paper) => paper.kind === 'justification')
  const { id, number, slug, title, seasonFrom, seasonTo } = contents.call
  return {
    reviewNumber: contents.reviewNumber,
    call: { id, number, slug, title, seasonFrom, seasonTo },
    kind: { title: contents.kind.title, pageLimit: contents.kind.pageLimit },
    title: contents.title,
    abstract: contents.abstract,
    category: contents.category,
    cosmology: contents.cosmology,
    site: contents.site,
    modes: contents.modes.filter((mode) => used.has(mode.modeId)),
    groups: contents.groups,
    targets: contents.targets,
    constraintSets: contents.constraintSets,
    observations: contents.observations,
    justification: justification ? { pages: justification.pages } : null,
    computation,
    engineVersion,
  }
}
