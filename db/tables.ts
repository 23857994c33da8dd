// Made by `npm run db:types` from the migrated schema; a test fails when the two differ.
import type { Knex } from 'knex'

type Insert<Row, Optional extends keyof Row> = Omit<Row, Optional> & Partial<Pick<Row, Optional>>

export interface AssessmentsRow {
  id: number
  request_id: number
  verdict: 'accepted' | 'change' | 'not-possible'
  true_seconds: number
  reason: string
  panel_note: string
  assessed_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface AssessmentQuestionsRow {
  id: number
  request_id: number
  question: string
  asked_by: number
  asked_at: Date
  due_at: Date
  answer: string | null
  answered_by: number | null
  answered_at: Date | null
}

export interface AssessmentRequestsRow {
  id: number
  proposal_id: number
  instrument_id: number
  passed_at: Date | null
  created_at: Date
}

export interface AssignmentsRow {
  id: number
  proposal_id: number
  person_id: number
  panel_id: number
  seat: 'first' | 'second' | 'reader'
  assigned_by: number | null
  assigned_at: Date
  finished_at: Date | null
  withdrawn_at: Date | null
  withdrawn_reason: string | null
  version: number
}

export interface AwardLinesRow {
  id: number
  decision_id: number
  instrument_id: number
  observation_id: number | null
  seconds: number
  service: 'queue' | 'visitor'
  conditions: string
  is_reserve: 0 | 1
  superseded_at: Date | null
  created_at: Date
}

export interface BillingRecordsRow {
  id: number
  record_version: number
  name: string
  address: string
  tax_number: string
  contact: string
  account_holder: string
  iban: string
  bic: string
  bank: string
  saved_by: number | null
  created_at: Date
}

export interface BulkLettersRow {
  id: number
  subject: string
  text_body: string
  audience: string
  written_by: number | null
  queued_at: Date | null
  recipients: number | null
  cancelled_at: Date | null
  version: number
  created_at: Date
}

export interface CallsRow {
  id: number
  number: number
  slug: string
  title: string
  summary: string
  site_id: number
  stage: 'planned' | 'published' | 'review' | 'ranking' | 'decided' | 'archived'
  season_from: string
  season_to: string
  opens_at: Date
  closes_at: Date
  grace_until: Date
  assessments_due_at: Date
  reviews_due_at: Date
  panel_meets_at: Date
  letters_at: Date
  currency: string | null
  version: number
  created_at: Date
}

export interface CallCorrectionsRow {
  id: number
  call_id: number
  concerns: string
  body: string
  made_by: number
  created_at: Date
}

export interface CallCriteriaRow {
  id: number
  call_id: number
  position: number
  title: string
  prompt: string
  weight: number
  criterion_version: number
}

export interface CallKindsRow {
  id: number
  call_id: number
  kind: string
  title: string
  closes_at: Date | null
  page_limit: number
  abstract_limit: number
  max_seconds: number | null
  fee_minor: number
  panel_id: number
  word_limit: number
  needs_student: 0 | 1
  figure_limit: number | null
  target_limit: number | null
  takes_awaited: 0 | 1
  needs_cadence: 0 | 1
  needs_last_night: 0 | 1
}

export interface CallModesRow {
  id: number
  call_id: number
  mode_id: number
}

export interface ConflictsRow {
  id: number
  person_id: number
  proposal_id: number
  kind: 'investigator' | 'institute' | 'collaborator' | 'family' | 'rival' | 'other'
  severity: 'barred' | 'disclosed'
  source: 'declared' | 'matched' | 'chair'
  note: string
  decided_by: number | null
  from_at: Date
  until_at: Date | null
}

export interface ConstraintSetsRow {
  id: number
  proposal_id: number
  name: string
  max_airmass: number
  image_quality_arcsec: number
  moon: 'dark' | 'grey' | 'any'
  min_moon_separation_deg: number
  transparency: 'photometric' | 'clear' | 'thin-cloud'
  position_angle_deg: number | null
  date_from: string | null
  date_to: string | null
  cadence: string | null
  version: number
}

export interface CountersRow {
  name: string
  last_number: number
}

export interface CreditNotesRow {
  id: number
  number: string
  fee_id: number
  invoice_id: number | null
  refund_id: number | null
  credited_to: string
  address: string
  billing_record_id: number | null
  amount_minor: number
  currency: string
  reason: string
  created_at: Date
}

export interface DecisionsRow {
  id: number
  proposal_id: number
  decision_version: number
  outcome: 'awarded' | 'reserve' | 'declined'
  statement: string
  decided_by: number | null
  released_at: Date | null
  superseded_at: Date | null
  version: number
  created_at: Date
  changed_by: number | null
  approved_by: number | null
  approved_version: number | null
  approved_at: Date | null
}

export interface DecisionOpeningsRow {
  id: number
  decision_id: number
  version: number
  person_id: number
  created_at: Date
}

export interface DemographicsRow {
  person_id: number
  purpose: string
  answers: string
  created_at: Date
}

export interface DisputesRow {
  id: number
  payment_id: number
  provider_dispute_id: string
  amount_minor: number
  reason: string
  state: 'open' | 'won' | 'lost'
  closed_at: Date | null
  decision: 'ask-again' | 'waive' | 'withdraw' | 'accept' | null
  decision_note: string
  decided_by: number | null
  decided_at: Date | null
  created_at: Date
}

export interface EmailTokensRow {
  id: number
  person_id: number
  purpose: 'confirm' | 'reset'
  token_hash: string
  expires_at: Date
  used_at: Date | null
  created_at: Date
}

export interface ExpertiseRow {
  id: number
  person_id: number
  kind: 'category' | 'word'
  term: string
  level: number | null
  created_at: Date
}

export interface FacilityRetirementsRow {
  id: number
  site_id: number | null
  telescope_id: number | null
  instrument_id: number | null
  mode_id: number | null
  retired_from: string
  created_at: Date
}

export interface FeesRow {
  id: number
  proposal_id: number
  amount_minor: number
  currency: string
  affiliation_class: 'member' | 'partner' | 'other'
  late_minor: number
  state: 'due' | 'paid' | 'waived' | 'invoiced' | 'refunded' | 'lapsed' | 'cancelled'
  due_at: Date
  settled_at: Date | null
  version: number
  created_at: Date
}

export interface FeeRatesRow {
  id: number
  call_kind_id: number
  affiliation_class: 'member' | 'partner' | 'other'
  amount_minor: number
  late_minor: number
}

export interface FiguresRow {
  id: number
  proposal_id: number
  object_id: number
  label: string
  caption: string
  file_name: string
  width_px: number
  height_px: number
  position: number
  removed_at: Date | null
  version: number
  created_at: Date
}

export interface HeldHoursRow {
  id: number
  call_id: number
  telescope_id: number
  seconds: number
  reason: string
  made_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface InstitutesRow {
  id: number
  name: string
  country: string | null
  affiliation_class: 'member' | 'partner' | 'other'
  created_at: Date
}

export interface InstrumentsRow {
  id: number
  telescope_id: number
  slug: string
  name: string
  summary: string
}

export interface InstrumentModesRow {
  id: number
  instrument_id: number
  slug: string
  name: string
}

export interface InterestDeclarationsRow {
  id: number
  person_id: number
  call_id: number
  declared_at: Date
}

export interface InvitationsRow {
  id: number
  token_hash: string
  email: string
  name: string
  role: 'reviewer' | 'chair' | 'instrument-scientist' | 'office' | 'investigator'
  call_id: number | null
  panel_id: number | null
  instrument_id: number | null
  invited_by: number | null
  expires_at: Date
  accepted_at: Date | null
  accepted_by: number | null
  withdrawn_at: Date | null
  created_at: Date
  proposal_id: number | null
  role_until_at: Date | null
}

export interface InvoicesRow {
  id: number
  number: string
  fee_id: number
  institute: string
  address: string
  billing_record_id: number | null
  purchase_order: string
  send_to: string
  amount_minor: number
  currency: string
  state: 'open' | 'settled' | 'cancelled'
  due_at: Date
  asked_by: number | null
  settled_on: string | null
  settled_reference: string
  closed_by: number | null
  closed_at: Date | null
  version: number
  created_at: Date
}

export interface LeastAwardsRow {
  id: number
  proposal_id: number
  instrument_id: number
  seconds: number
  reason: string
  made_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface LogbookRow {
  id: number
  at: Date
  person_id: number | null
  acting_as: string
  action: string
  subject_kind: string
  subject_id: string
  before_value: string | null
  after_value: string | null
  request_id: string
  address: string
  previous_hash: string
  hash: string
}

export interface LogbookChecksRow {
  id: number
  checked_at: Date
  checked_by: number | null
  rows_checked: number
  fault: string | null
}

export interface LogbookHeadRow {
  id: number
  last_hash: string
}

export interface MergedEntriesRow {
  id: number
  list_id: number
  proposal_id: number
  ranking_id: number
  place: number
  used_share: number | null
  is_near: 0 | 1
}

export interface MergedListsRow {
  id: number
  call_id: number
  list_version: number
  frozen_at: Date | null
  made_by: number | null
  superseded_at: Date | null
  version: number
  created_at: Date
}

export interface MergeMovesRow {
  id: number
  list_id: number
  proposal_id: number
  from_place: number
  to_place: number
  reason: string
  moved_by: number | null
  created_at: Date
}

export interface ModeRecordsRow {
  id: number
  mode_id: number
  record_version: number
  valid_from: string
  kind: 'imaging' | 'long-slit'
  wavelength_min_a: number
  wavelength_max_a: number
  medium: 'air' | 'vacuum'
  band: string | null
  pixel_scale_arcsec: number
  dispersion_a_per_pixel: number | null
  slit_width_arcsec: number | null
  resolving_power: number | null
  read_noise_e: number
  dark_e_per_s: number
  full_well_e: number
  gain_e_per_adu: number
  min_sub_exposure_s: number
  max_sub_exposure_s: number
  systematic_floor: number
  twilight_limit_deg: number
  throughput: string
  throughput_includes: string
  overheads: string
  created_at: Date
  sky_subtraction: 'around' | 'paired' | 'blank-sky'
  background_pixels: number | null
  thermal_e_per_s: number
  optics_arcsec: number
  dispersion_corrected: 0 | 1
  read_noise_per: 'read' | 'ramp'
  filters: string
  calibration_policy: string
}

export interface MoneyEntriesRow {
  id: number
  movement: string
  fee_id: number
  account:
    | 'receivable'
    | 'income'
    | 'provider'
    | 'waived'
    | 'refunds'
    | 'invoiced'
    | 'bank'
    | 'owed-back'
    | 'disputed'
    | 'firm-fees'
    | 'lost'
  amount_minor: number
  currency: string
  created_at: Date
}

export interface NightBlocksRow {
  id: number
  call_id: number
  telescope_id: number
  instrument_id: number | null
  evening_date: string
  use_for: 'science' | 'engineering' | 'promised'
  fraction_from: string
  fraction_to: string
  dark_seconds: number
  note: string
}

export interface NightChoicesRow {
  id: number
  proposal_id: number
  choice: 'must' | 'never' | 'filler'
  reason: string
  made_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface ObservationsRow {
  id: number
  proposal_id: number
  target_id: number
  mode_id: number
  constraint_set_id: number
  position: number
  wanted_snr: number
  snr_per: 'image' | 'pixel' | 'angstrom' | 'resolution-element'
  feature: string | null
  feature_rest_a: number | null
  asked_seconds: number
  version: number
  created_at: Date
}

export interface OutboxRow {
  id: number
  dedupe_key: string
  message_id: string
  template: string
  person_id: number | null
  to_email: string
  to_name: string
  subject: string
  text_body: string
  html_body: string
  state: 'queued' | 'sending' | 'sent' | 'parked' | 'bounced' | 'cancelled'
  attempts: number
  next_attempt_at: Date
  claimed_until: Date | null
  last_error: string | null
  sent_at: Date | null
  created_at: Date
  attachment: string | null
  bulk_letter_id: number | null
  again_of: number | null
}

export interface PacketsRow {
  id: number
  proposal_version_id: number
  variant: 'anonymised' | 'full'
  object_id: number
  pages: number
  content_hash: string
  superseded_at: Date | null
  created_at: Date
}

export interface PanelsRow {
  id: number
  call_id: number
  name: string
  quorum: number
  formula: string | null
  formula_by: number | null
  formula_at: Date | null
  discussing_id: number | null
  discussing_since: Date | null
}

export interface PanelMembersRow {
  id: number
  panel_id: number
  person_id: number
  seat: 'chair' | 'deputy' | 'member'
  number: number
  left_at: Date | null
  created_at: Date
  present_at: Date | null
}

export interface PapersRow {
  id: number
  proposal_id: number
  object_id: number
  kind: 'justification' | 'team-expertise'
  file_name: string
  pages: number
  uploaded_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface PaperRepairsRow {
  id: number
  proposal_id: number
  paper_kind: 'justification' | 'team-expertise'
  reason: string
  opened_by: number
  open_until: Date
  taken_back_at: Date | null
  version_id: number | null
  created_at: Date
}

export interface PaymentsRow {
  id: number
  fee_id: number
  idempotency_key: string
  provider_session_id: string | null
  provider_payment_id: string | null
  checkout_url: string | null
  amount_minor: number
  currency: string
  state: 'created' | 'open' | 'succeeded' | 'failed' | 'expired'
  card_last4: string | null
  failure: string | null
  started_by: number | null
  succeeded_at: Date | null
  created_at: Date
}

export interface PaymentEventsRow {
  id: number
  provider_event_id: string
  event_type: string
  payment_id: number | null
  payload: string
  effect: string
  provider_created_at: Date
  created_at: Date
}

export interface PeopleRow {
  id: number
  email: string
  name: string
  sort_name: string
  institute_id: number | null
  institute_text: string
  orcid: string | null
  orcid_verified_at: Date | null
  career_stage: 'student' | 'postdoc' | 'staff' | 'emeritus' | 'other' | null
  time_zone: string
  password_hash: string | null
  email_confirmed_at: Date | null
  disabled_at: Date | null
  is_demo: 0 | 1
  version: number
  created_at: Date
  address_failed_at: Date | null
  address_failed_why: string | null
  erasure_asked_at: Date | null
  erased_at: Date | null
  merged_into_id: number | null
}

export interface ProgrammesRow {
  id: number
  title: string
  lead_person_id: number
  created_at: Date
}

export interface ProposalsRow {
  id: number
  reference: string
  programme_id: number
  call_id: number
  call_kind_id: number
  panel_id: number | null
  state: 'draft' | 'submitted' | 'under-review' | 'awarded' | 'reserve' | 'declined' | 'withdrawn' | 'lapsed'
  is_reopened: 0 | 1
  review_number: string | null
  title: string
  abstract: string
  category: string
  cosmology_id: string
  cosmology_parameters: string
  comparison_cosmology_id: string | null
  sections_done: string
  closes_at: Date | null
  withdrawn_at: Date | null
  withdrawn_reason: string | null
  created_by: number
  version: number
  created_at: Date
  updated_at: Date
  continues_id: number | null
  lead_offered_to: number | null
  lead_offered_at: Date | null
}

export interface ProposalPeopleRow {
  id: number
  proposal_id: number
  person_id: number | null
  name: string
  email: string
  institute: string
  role: 'pi' | 'co-investigator'
  access: 'read' | 'edit' | 'deputy'
  is_student: 0 | 1
  position: number
  confirmed_at: Date | null
  created_at: Date
  orcid: string | null
  is_supervisor: 0 | 1
  version: number
}

export interface ProposalVersionsRow {
  id: number
  proposal_id: number
  version_number: number
  snapshot: string
  snapshot_sha256: string
  engine_version: string
  paper_id: number | null
  idempotency_key: string
  arrived_at: Date
  committed_at: Date
  submitted_by: number
  superseded_at: Date | null
}

export interface ProposalVersionPeopleRow {
  id: number
  proposal_version_id: number
  person_id: number | null
  name: string
  institute: string
  career_stage: string | null
  role: 'pi' | 'co-investigator'
  position: number
}

export interface RankingsRow {
  id: number
  panel_id: number
  ranking_version: number
  line_after: number | null
  frozen_at: Date | null
  made_by: number | null
  superseded_at: Date | null
  version: number
  created_at: Date
}

export interface RankingEntriesRow {
  id: number
  ranking_id: number
  proposal_id: number
  place: number
  raw_mean: number | null
  set_aside_at: Date | null
}

export interface RankMovesRow {
  id: number
  ranking_id: number
  proposal_id: number
  from_place: number
  to_place: number
  reason: string
  moved_by: number | null
  created_at: Date
}

export interface ReceiptsRow {
  id: number
  number: string
  fee_id: number
  payment_id: number
  payer: string
  created_at: Date
}

export interface RecusalsRow {
  id: number
  assignment_id: number
  reason: string
  created_at: Date
}

export interface RefundsRow {
  id: number
  payment_id: number | null
  invoice_id: number | null
  idempotency_key: string
  provider_refund_id: string | null
  amount_minor: number
  is_surplus: 0 | 1
  state: 'created' | 'succeeded' | 'failed'
  failure: string
  reason: string
  made_by: number | null
  closed_at: Date | null
  created_at: Date
}

export interface ReviewTextsRow {
  id: number
  assignment_id: number
  audience: 'investigators' | 'panel' | 'private'
  body: string
  version: number
  saved_at: Date
  withheld_at: Date | null
  withheld_by: number | null
  withheld_reason: string | null
}

export interface RoleGrantsRow {
  id: number
  person_id: number
  role: 'investigator' | 'reviewer' | 'chair' | 'instrument-scientist' | 'office'
  call_id: number | null
  panel_id: number | null
  instrument_id: number | null
  from_at: Date
  until_at: Date | null
  granted_by: number | null
  revoked_at: Date | null
  created_at: Date
}

export interface ScoreEventsRow {
  id: number
  assignment_id: number
  criterion_id: number
  criterion_version: number
  scale_version: number
  round: 'before-discussion' | 'after-discussion'
  half_points: number | null
  created_at: Date
}

export interface ServiceWishesRow {
  id: number
  proposal_id: number
  instrument_id: number
  least_seconds: number | null
  visit_nights: number | null
  visit_part: 'whole' | 'first' | 'second'
  visit_together: 0 | 1
  version: number
  created_at: Date
}

export interface SessionsRow {
  id_hash: string
  person_id: number
  last_seen_at: Date
  expires_at: Date
  ended_at: Date | null
  user_agent: string
  created_at: Date
}

export interface ShareRulesRow {
  id: number
  call_id: number
  rule: 'hours' | 'proposals' | 'fixed'
  percents: string | null
  reason: string
  made_by: number
  superseded_at: Date | null
  created_at: Date
}

export interface SitesRow {
  id: number
  slug: string
  name: string
}

export interface SiteRecordsRow {
  id: number
  site_id: number
  record_version: number
  valid_from: string
  latitude_deg: number
  longitude_deg: number
  elevation_m: number
  time_zone: string
  utc_offset_hours: number
  lowest_altitude_deg: number
  extinction_mag_per_airmass: string
  dark_sky_mag_arcsec2: string
  seeing_arcsec: string
  created_at: Date
  horizon: string
  weather: string | null
}

export interface StoredObjectsRow {
  id: number
  object_key: string
  sha256: string
  size_bytes: number
  content_type: string
  purpose: 'paper' | 'packet' | 'receipt' | 'record' | 'figure'
  created_at: Date
}

export interface TargetsRow {
  id: number
  proposal_id: number
  group_id: number | null
  position: number
  name: string
  ra_typed: string
  dec_typed: string
  ra_deg: number | null
  dec_deg: number | null
  epoch_yr: number
  pm_ra_mas_yr: number | null
  pm_dec_mas_yr: number | null
  geometry: 'point' | 'sersic' | 'uniform'
  effective_radius_arcsec: number | null
  sersic_index: number | null
  redshift_typed: string
  redshift: number | null
  redshift_error: number | null
  redshift_frame: 'heliocentric' | 'cmb'
  redshift_type: 'spectroscopic' | 'photometric' | 'assumed'
  need: 'required' | 'optional' | 'backup'
  opportunity_class: string | null
  opportunity_trigger: string | null
  opportunity_reaction_s: number | null
  opportunity_count: number | null
  version: number
  created_at: Date
  galactic_ebv: number | null
  magnification: number | null
  magnification_error: number | null
  spectrum_kind: 'power-law' | 'black-body' | 'table' | null
  spectral_index: number | null
  spectral_index_error: number | null
  temperature_k: number | null
  spectrum_table: string | null
}

export interface TargetGroupsRow {
  id: number
  proposal_id: number
  name: string
  rule: 'all' | 'at-least' | 'backup'
  at_least: number | null
  hours_for: 'all' | 'at-least'
  version: number
}

export interface TargetQuantitiesRow {
  id: number
  target_id: number
  quantity: 'magnitude' | 'line-flux' | 'luminosity' | 'size'
  value: number
  error: number | null
  unit: string
  magnitude_system: 'AB' | 'Vega' | 'ST' | null
  band: string | null
  provenance: 'observed' | 'predicted'
  reference_cosmology_id: string | null
  dust_corrected: 0 | 1
  magnification: number | null
  source: string
  width_km_s: number | null
}

export interface TelescopesRow {
  id: number
  site_id: number
  slug: string
  name: string
}

export interface TelescopeRecordsRow {
  id: number
  telescope_id: number
  record_version: number
  valid_from: string
  aperture_m: number
  collecting_area_m2: number
  created_at: Date
  horizon: string
  highest_altitude_deg: number | null
}

export interface TimeEntriesRow {
  id: number
  transfer_id: number
  account: 'outside' | 'asked' | 'recommended' | 'awarded' | 'scheduled' | 'executed' | 'lost' | 'carried'
  seconds: number
}

export interface TimeTransfersRow {
  id: number
  proposal_id: number
  observation_id: number | null
  share: string
  reason: string
  made_by: number | null
  created_at: Date
}

export interface VisitHalvesRow {
  id: number
  award_line_id: number
  call_id: number
  telescope_id: number
  evening_date: string
  half: 'first' | 'second'
  seconds: number
  holds: number | null
}

export interface WaiversRow {
  id: number
  fee_id: number
  reason: string
  state: 'asked' | 'granted' | 'refused'
  asked_by: number
  decided_by: number | null
  decision_note: string
  decided_at: Date | null
  created_at: Date
}

export interface WritingsRow {
  id: number
  proposal_id: number
  part: 'justification' | 'references' | 'team'
  body: string
  version: number
  created_at: Date
  updated_at: Date
}

declare module 'knex/types/tables.js' {
  interface Tables {
    assessments: Knex.CompositeTableType<
      AssessmentsRow,
      Insert<AssessmentsRow, 'id' | 'superseded_at' | 'created_at'>
    >
    assessment_questions: Knex.CompositeTableType<
      AssessmentQuestionsRow,
      Insert<AssessmentQuestionsRow, 'id' | 'answer' | 'answered_by' | 'answered_at'>
    >
    assessment_requests: Knex.CompositeTableType<
      AssessmentRequestsRow,
      Insert<AssessmentRequestsRow, 'id' | 'passed_at' | 'created_at'>
    >
    assignments: Knex.CompositeTableType<
      AssignmentsRow,
      Insert<
        AssignmentsRow,
        'id' | 'seat' | 'assigned_by' | 'finished_at' | 'withdrawn_at' | 'withdrawn_reason' | 'version'
      >
    >
    award_lines: Knex.CompositeTableType<
      AwardLinesRow,
      Insert<
        AwardLinesRow,
        'id' | 'observation_id' | 'service' | 'conditions' | 'is_reserve' | 'superseded_at' | 'created_at'
      >
    >
    billing_records: Knex.CompositeTableType<
      BillingRecordsRow,
      Insert<BillingRecordsRow, 'id' | 'tax_number' | 'saved_by' | 'created_at'>
    >
    bulk_letters: Knex.CompositeTableType<
      BulkLettersRow,
      Insert<
        BulkLettersRow,
        'id' | 'written_by' | 'queued_at' | 'recipients' | 'cancelled_at' | 'version' | 'created_at'
      >
    >
    calls: Knex.CompositeTableType<
      CallsRow,
      Insert<CallsRow, 'id' | 'stage' | 'currency' | 'version' | 'created_at'>
    >
    call_corrections: Knex.CompositeTableType<
      CallCorrectionsRow,
      Insert<CallCorrectionsRow, 'id' | 'created_at'>
    >
    call_criteria: Knex.CompositeTableType<
      CallCriteriaRow,
      Insert<CallCriteriaRow, 'id' | 'criterion_version'>
    >
    call_kinds: Knex.CompositeTableType<
      CallKindsRow,
      Insert<
        CallKindsRow,
        | 'id'
        | 'closes_at'
        | 'max_seconds'
        | 'fee_minor'
        | 'word_limit'
        | 'needs_student'
        | 'figure_limit'
        | 'target_limit'
        | 'takes_awaited'
        | 'needs_cadence'
        | 'needs_last_night'
      >
    >
    call_modes: Knex.CompositeTableType<CallModesRow, Insert<CallModesRow, 'id'>>
    conflicts: Knex.CompositeTableType<
      ConflictsRow,
      Insert<ConflictsRow, 'id' | 'severity' | 'note' | 'decided_by' | 'until_at'>
    >
    constraint_sets: Knex.CompositeTableType<
      ConstraintSetsRow,
      Insert<
        ConstraintSetsRow,
        | 'id'
        | 'max_airmass'
        | 'image_quality_arcsec'
        | 'moon'
        | 'min_moon_separation_deg'
        | 'transparency'
        | 'position_angle_deg'
        | 'date_from'
        | 'date_to'
        | 'cadence'
        | 'version'
      >
    >
    counters: Knex.CompositeTableType<CountersRow, Insert<CountersRow, 'last_number'>>
    credit_notes: Knex.CompositeTableType<
      CreditNotesRow,
      Insert<
        CreditNotesRow,
        'id' | 'invoice_id' | 'refund_id' | 'address' | 'billing_record_id' | 'created_at'
      >
    >
    decisions: Knex.CompositeTableType<
      DecisionsRow,
      Insert<
        DecisionsRow,
        | 'id'
        | 'decided_by'
        | 'released_at'
        | 'superseded_at'
        | 'version'
        | 'created_at'
        | 'changed_by'
        | 'approved_by'
        | 'approved_version'
        | 'approved_at'
      >
    >
    decision_openings: Knex.CompositeTableType<
      DecisionOpeningsRow,
      Insert<DecisionOpeningsRow, 'id' | 'created_at'>
    >
    demographics: Knex.CompositeTableType<DemographicsRow, Insert<DemographicsRow, 'created_at'>>
    disputes: Knex.CompositeTableType<
      DisputesRow,
      Insert<
        DisputesRow,
        | 'id'
        | 'state'
        | 'closed_at'
        | 'decision'
        | 'decision_note'
        | 'decided_by'
        | 'decided_at'
        | 'created_at'
      >
    >
    email_tokens: Knex.CompositeTableType<
      EmailTokensRow,
      Insert<EmailTokensRow, 'id' | 'used_at' | 'created_at'>
    >
    expertise: Knex.CompositeTableType<ExpertiseRow, Insert<ExpertiseRow, 'id' | 'level' | 'created_at'>>
    facility_retirements: Knex.CompositeTableType<
      FacilityRetirementsRow,
      Insert<
        FacilityRetirementsRow,
        'id' | 'site_id' | 'telescope_id' | 'instrument_id' | 'mode_id' | 'created_at'
      >
    >
    fees: Knex.CompositeTableType<
      FeesRow,
      Insert<
        FeesRow,
        'id' | 'affiliation_class' | 'late_minor' | 'state' | 'settled_at' | 'version' | 'created_at'
      >
    >
    fee_rates: Knex.CompositeTableType<FeeRatesRow, Insert<FeeRatesRow, 'id' | 'late_minor'>>
    figures: Knex.CompositeTableType<
      FiguresRow,
      Insert<FiguresRow, 'id' | 'removed_at' | 'version' | 'created_at'>
    >
    held_hours: Knex.CompositeTableType<
      HeldHoursRow,
      Insert<HeldHoursRow, 'id' | 'superseded_at' | 'created_at'>
    >
    institutes: Knex.CompositeTableType<
      InstitutesRow,
      Insert<InstitutesRow, 'id' | 'country' | 'affiliation_class' | 'created_at'>
    >
    instruments: Knex.CompositeTableType<InstrumentsRow, Insert<InstrumentsRow, 'id'>>
    instrument_modes: Knex.CompositeTableType<InstrumentModesRow, Insert<InstrumentModesRow, 'id'>>
    interest_declarations: Knex.CompositeTableType<
      InterestDeclarationsRow,
      Insert<InterestDeclarationsRow, 'id'>
    >
    invitations: Knex.CompositeTableType<
      InvitationsRow,
      Insert<
        InvitationsRow,
        | 'id'
        | 'name'
        | 'call_id'
        | 'panel_id'
        | 'instrument_id'
        | 'invited_by'
        | 'accepted_at'
        | 'accepted_by'
        | 'withdrawn_at'
        | 'created_at'
        | 'proposal_id'
        | 'role_until_at'
      >
    >
    invoices: Knex.CompositeTableType<
      InvoicesRow,
      Insert<
        InvoicesRow,
        | 'id'
        | 'billing_record_id'
        | 'purchase_order'
        | 'state'
        | 'asked_by'
        | 'settled_on'
        | 'settled_reference'
        | 'closed_by'
        | 'closed_at'
        | 'version'
        | 'created_at'
      >
    >
    least_awards: Knex.CompositeTableType<
      LeastAwardsRow,
      Insert<LeastAwardsRow, 'id' | 'superseded_at' | 'created_at'>
    >
    logbook: Knex.CompositeTableType<
      LogbookRow,
      Insert<LogbookRow, 'id' | 'person_id' | 'before_value' | 'after_value' | 'address'>
    >
    logbook_checks: Knex.CompositeTableType<
      LogbookChecksRow,
      Insert<LogbookChecksRow, 'id' | 'checked_by' | 'fault'>
    >
    logbook_head: Knex.CompositeTableType<LogbookHeadRow, Insert<LogbookHeadRow, never>>
    merged_entries: Knex.CompositeTableType<MergedEntriesRow, Insert<MergedEntriesRow, 'id' | 'used_share'>>
    merged_lists: Knex.CompositeTableType<
      MergedListsRow,
      Insert<MergedListsRow, 'id' | 'frozen_at' | 'made_by' | 'superseded_at' | 'version' | 'created_at'>
    >
    merge_moves: Knex.CompositeTableType<
      MergeMovesRow,
      Insert<MergeMovesRow, 'id' | 'moved_by' | 'created_at'>
    >
    mode_records: Knex.CompositeTableType<
      ModeRecordsRow,
      Insert<
        ModeRecordsRow,
        | 'id'
        | 'band'
        | 'dispersion_a_per_pixel'
        | 'slit_width_arcsec'
        | 'resolving_power'
        | 'created_at'
        | 'sky_subtraction'
        | 'background_pixels'
        | 'thermal_e_per_s'
        | 'optics_arcsec'
        | 'dispersion_corrected'
        | 'read_noise_per'
        | 'filters'
        | 'calibration_policy'
      >
    >
    money_entries: Knex.CompositeTableType<MoneyEntriesRow, Insert<MoneyEntriesRow, 'id' | 'created_at'>>
    night_blocks: Knex.CompositeTableType<
      NightBlocksRow,
      Insert<NightBlocksRow, 'id' | 'instrument_id' | 'fraction_from' | 'fraction_to' | 'note'>
    >
    night_choices: Knex.CompositeTableType<
      NightChoicesRow,
      Insert<NightChoicesRow, 'id' | 'superseded_at' | 'created_at'>
    >
    observations: Knex.CompositeTableType<
      ObservationsRow,
      Insert<ObservationsRow, 'id' | 'feature' | 'feature_rest_a' | 'version' | 'created_at'>
    >
    outbox: Knex.CompositeTableType<
      OutboxRow,
      Insert<
        OutboxRow,
        | 'id'
        | 'person_id'
        | 'to_name'
        | 'state'
        | 'attempts'
        | 'claimed_until'
        | 'last_error'
        | 'sent_at'
        | 'created_at'
        | 'attachment'
        | 'bulk_letter_id'
        | 'again_of'
      >
    >
    packets: Knex.CompositeTableType<PacketsRow, Insert<PacketsRow, 'id' | 'superseded_at' | 'created_at'>>
    panels: Knex.CompositeTableType<
      PanelsRow,
      Insert<
        PanelsRow,
        'id' | 'quorum' | 'formula' | 'formula_by' | 'formula_at' | 'discussing_id' | 'discussing_since'
      >
    >
    panel_members: Knex.CompositeTableType<
      PanelMembersRow,
      Insert<PanelMembersRow, 'id' | 'left_at' | 'created_at' | 'present_at'>
    >
    papers: Knex.CompositeTableType<PapersRow, Insert<PapersRow, 'id' | 'superseded_at' | 'created_at'>>
    paper_repairs: Knex.CompositeTableType<
      PaperRepairsRow,
      Insert<PaperRepairsRow, 'id' | 'taken_back_at' | 'version_id' | 'created_at'>
    >
    payments: Knex.CompositeTableType<
      PaymentsRow,
      Insert<
        PaymentsRow,
        | 'id'
        | 'provider_session_id'
        | 'provider_payment_id'
        | 'checkout_url'
        | 'state'
        | 'card_last4'
        | 'failure'
        | 'started_by'
        | 'succeeded_at'
        | 'created_at'
      >
    >
    payment_events: Knex.CompositeTableType<
      PaymentEventsRow,
      Insert<PaymentEventsRow, 'id' | 'payment_id' | 'created_at'>
    >
    people: Knex.CompositeTableType<
      PeopleRow,
      Insert<
        PeopleRow,
        | 'id'
        | 'institute_id'
        | 'institute_text'
        | 'orcid'
        | 'orcid_verified_at'
        | 'career_stage'
        | 'time_zone'
        | 'password_hash'
        | 'email_confirmed_at'
        | 'disabled_at'
        | 'is_demo'
        | 'version'
        | 'created_at'
        | 'address_failed_at'
        | 'address_failed_why'
        | 'erasure_asked_at'
        | 'erased_at'
        | 'merged_into_id'
      >
    >
    programmes: Knex.CompositeTableType<ProgrammesRow, Insert<ProgrammesRow, 'id' | 'created_at'>>
    proposals: Knex.CompositeTableType<
      ProposalsRow,
      Insert<
        ProposalsRow,
        | 'id'
        | 'panel_id'
        | 'state'
        | 'is_reopened'
        | 'review_number'
        | 'title'
        | 'category'
        | 'cosmology_id'
        | 'comparison_cosmology_id'
        | 'closes_at'
        | 'withdrawn_at'
        | 'withdrawn_reason'
        | 'version'
        | 'created_at'
        | 'continues_id'
        | 'lead_offered_to'
        | 'lead_offered_at'
      >
    >
    proposal_people: Knex.CompositeTableType<
      ProposalPeopleRow,
      Insert<
        ProposalPeopleRow,
        | 'id'
        | 'person_id'
        | 'institute'
        | 'access'
        | 'is_student'
        | 'confirmed_at'
        | 'created_at'
        | 'orcid'
        | 'is_supervisor'
        | 'version'
      >
    >
    proposal_versions: Knex.CompositeTableType<
      ProposalVersionsRow,
      Insert<ProposalVersionsRow, 'id' | 'paper_id' | 'superseded_at'>
    >
    proposal_version_people: Knex.CompositeTableType<
      ProposalVersionPeopleRow,
      Insert<ProposalVersionPeopleRow, 'id' | 'person_id' | 'career_stage'>
    >
    rankings: Knex.CompositeTableType<
      RankingsRow,
      Insert<
        RankingsRow,
        'id' | 'line_after' | 'frozen_at' | 'made_by' | 'superseded_at' | 'version' | 'created_at'
      >
    >
    ranking_entries: Knex.CompositeTableType<
      RankingEntriesRow,
      Insert<RankingEntriesRow, 'id' | 'raw_mean' | 'set_aside_at'>
    >
    rank_moves: Knex.CompositeTableType<RankMovesRow, Insert<RankMovesRow, 'id' | 'moved_by' | 'created_at'>>
    receipts: Knex.CompositeTableType<ReceiptsRow, Insert<ReceiptsRow, 'id' | 'created_at'>>
    recusals: Knex.CompositeTableType<RecusalsRow, Insert<RecusalsRow, 'id' | 'created_at'>>
    refunds: Knex.CompositeTableType<
      RefundsRow,
      Insert<
        RefundsRow,
        | 'id'
        | 'payment_id'
        | 'invoice_id'
        | 'provider_refund_id'
        | 'is_surplus'
        | 'state'
        | 'failure'
        | 'made_by'
        | 'closed_at'
        | 'created_at'
      >
    >
    review_texts: Knex.CompositeTableType<
      ReviewTextsRow,
      Insert<ReviewTextsRow, 'id' | 'version' | 'withheld_at' | 'withheld_by' | 'withheld_reason'>
    >
    role_grants: Knex.CompositeTableType<
      RoleGrantsRow,
      Insert<
        RoleGrantsRow,
        | 'id'
        | 'call_id'
        | 'panel_id'
        | 'instrument_id'
        | 'until_at'
        | 'granted_by'
        | 'revoked_at'
        | 'created_at'
      >
    >
    score_events: Knex.CompositeTableType<
      ScoreEventsRow,
      Insert<ScoreEventsRow, 'id' | 'scale_version' | 'half_points' | 'created_at'>
    >
    service_wishes: Knex.CompositeTableType<
      ServiceWishesRow,
      Insert<
        ServiceWishesRow,
        'id' | 'least_seconds' | 'visit_nights' | 'visit_part' | 'visit_together' | 'version' | 'created_at'
      >
    >
    sessions: Knex.CompositeTableType<
      SessionsRow,
      Insert<SessionsRow, 'ended_at' | 'user_agent' | 'created_at'>
    >
    share_rules: Knex.CompositeTableType<
      ShareRulesRow,
      Insert<ShareRulesRow, 'id' | 'percents' | 'superseded_at' | 'created_at'>
    >
    sites: Knex.CompositeTableType<SitesRow, Insert<SitesRow, 'id'>>
    site_records: Knex.CompositeTableType<
      SiteRecordsRow,
      Insert<SiteRecordsRow, 'id' | 'created_at' | 'horizon' | 'weather'>
    >
    stored_objects: Knex.CompositeTableType<StoredObjectsRow, Insert<StoredObjectsRow, 'id' | 'created_at'>>
    targets: Knex.CompositeTableType<
      TargetsRow,
      Insert<
        TargetsRow,
        | 'id'
        | 'group_id'
        | 'ra_typed'
        | 'dec_typed'
        | 'ra_deg'
        | 'dec_deg'
        | 'epoch_yr'
        | 'pm_ra_mas_yr'
        | 'pm_dec_mas_yr'
        | 'geometry'
        | 'effective_radius_arcsec'
        | 'sersic_index'
        | 'redshift_typed'
        | 'redshift'
        | 'redshift_error'
        | 'redshift_frame'
        | 'redshift_type'
        | 'need'
        | 'opportunity_class'
        | 'opportunity_trigger'
        | 'opportunity_reaction_s'
        | 'opportunity_count'
        | 'version'
        | 'created_at'
        | 'galactic_ebv'
        | 'magnification'
        | 'magnification_error'
        | 'spectrum_kind'
        | 'spectral_index'
        | 'spectral_index_error'
        | 'temperature_k'
        | 'spectrum_table'
      >
    >
    target_groups: Knex.CompositeTableType<
      TargetGroupsRow,
      Insert<TargetGroupsRow, 'id' | 'at_least' | 'hours_for' | 'version'>
    >
    target_quantities: Knex.CompositeTableType<
      TargetQuantitiesRow,
      Insert<
        TargetQuantitiesRow,
        | 'id'
        | 'error'
        | 'magnitude_system'
        | 'band'
        | 'provenance'
        | 'reference_cosmology_id'
        | 'dust_corrected'
        | 'magnification'
        | 'source'
        | 'width_km_s'
      >
    >
    telescopes: Knex.CompositeTableType<TelescopesRow, Insert<TelescopesRow, 'id'>>
    telescope_records: Knex.CompositeTableType<
      TelescopeRecordsRow,
      Insert<TelescopeRecordsRow, 'id' | 'created_at' | 'horizon' | 'highest_altitude_deg'>
    >
    time_entries: Knex.CompositeTableType<TimeEntriesRow, Insert<TimeEntriesRow, 'id'>>
    time_transfers: Knex.CompositeTableType<
      TimeTransfersRow,
      Insert<TimeTransfersRow, 'id' | 'observation_id' | 'share' | 'made_by' | 'created_at'>
    >
    visit_halves: Knex.CompositeTableType<VisitHalvesRow, Insert<VisitHalvesRow, 'id' | 'holds'>>
    waivers: Knex.CompositeTableType<
      WaiversRow,
      Insert<WaiversRow, 'id' | 'state' | 'decided_by' | 'decision_note' | 'decided_at' | 'created_at'>
    >
    writings: Knex.CompositeTableType<WritingsRow, Insert<WritingsRow, 'id' | 'version' | 'created_at'>>
  }
}
