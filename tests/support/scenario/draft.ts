import { createHash } from 'node:crypto'
import type { Database } from '@/db/client'
import type { Actor } from '@/lib/domain/actor'
import { findPreset } from '@/lib/science/cosmology'
import type { ObjectStore } from '@/lib/services/storage/ObjectStore'
import type { ScenarioCall } from './call'
import type { ScenarioFacility } from './facility'
import { samplePdf } from './samplePdf'

export interface ScenarioDraft {
  proposalId: number
  reference: string
  targetId: number
  observationId: number
  constraintSetId: number
  paperId: number
}

const sections = ['question', 'targets', 'cosmology', 'observing', 'feasibility', 'people', 'papers']

/** A draft with everything a proposal needs to be sent: one target, one observation, two people, a paper. */
export async function makeDraft(
  db: Database,
  given: {
    reference: string
    facility: ScenarioFacility
    call: ScenarioCall
    pi: Actor
    coInvestigator: Actor
    /** Where the paper's bytes go; without it only the row is made. */
    storage?: ObjectStore
  },
): Promise<ScenarioDraft> {
  const { reference, facility, call, pi, coInvestigator } = given
  const title = 'Broad lines behind a lens'
  const [programmeId = 0] = await db('programmes').insert({ title, lead_person_id: pi.personId })
  const [proposalId = 0] = await db('proposals').insert({
    reference,
    programme_id: programmeId,
    call_id: call.callId,
    call_kind_id: call.kindId,
    title,
    abstract:
      'We measure Hβ and [O III] λ5008 at z ≈ 0.158, to σ ≤ 3 %, from one quasar that needs no introduction.',
    category: 'Active galaxies and black holes',
    cosmology_id: 'planck-2018',
    cosmology_parameters: JSON.stringify(findPreset('planck-2018').parameters),
    sections_done: JSON.stringify(sections),
    created_by: pi.personId,
    updated_at: new Date(),
  })
  await db('proposal_people').insert(
    [pi, coInvestigator].map((person, index) => ({
      proposal_id: proposalId,
      person_id: person.personId,
      name: person.name,
      email: person.email,
      institute: `${person.name.split(' ').at(-1) ?? ''} Institute`,
      role: index === 0 ? ('pi' as const) : ('co-investigator' as const),
      access: 'edit' as const,
      position: index + 1,
      confirmed_at: new Date(),
    })),
  )
  const [targetId = 0] = await db('targets').insert({
    proposal_id: proposalId,
    position: 1,
    name: 'QSO J2026−4536',
    ra_typed: '20 26 10.43',
    dec_typed: '-45 36 27.1',
    ra_deg: 306.5434583,
    dec_deg: -45.6075278,
    redshift_typed: '0.158',
    redshift: 0.158,
  })
  await db('target_quantities').insert({
    target_id: targetId,
    quantity: 'magnitude',
    value: 16.6,
    unit: 'mag',
    magnitude_system: 'AB',
    band: 'V',
    source: 'own photometry',
  })
  const [constraintSetId = 0] = await db('constraint_sets').insert({
    proposal_id: proposalId,
    name: 'Any Moon',
  })
  const [observationId = 0] = await db('observations').insert({
    proposal_id: proposalId,
    target_id: targetId,
    mode_id: facility.modeId,
    constraint_set_id: constraintSetId,
    position: 1,
    wanted_snr: 30,
    snr_per: 'resolution-element',
    feature: '[O III] λ5008',
    feature_rest_a: 5008.24,
    asked_seconds: 7200,
  })
  const bytes = await samplePdf(2)
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  const objectKey = `a0/${createHash('sha256').update(reference).digest('hex').slice(0, 32)}`
  await given.storage?.put(objectKey, bytes, 'application/pdf')
  const [objectId = 0] = await db('stored_objects').insert({
    object_key: objectKey,
    sha256,
    size_bytes: bytes.byteLength,
    content_type: 'application/pdf',
    purpose: 'paper',
  })
  const [paperId = 0] = await db('papers').insert({
    proposal_id: proposalId,
    object_id: objectId,
    kind: 'justification',
    file_name: 'lens-v6 (Sollvik).pdf',
    pages: 2,
    uploaded_by: pi.personId,
  })
  return { proposalId, reference, targetId, observationId, constraintSetId, paperId }
}
