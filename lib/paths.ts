/** Every address of the product. Nothing else writes one by hand. */
const part = encodeURIComponent

export type ProposalSection =
  'question' | 'targets' | 'cosmology' | 'observing' | 'feasibility' | 'people' | 'papers' | 'send'

export type PanelPage =
  'assignments' | 'progress' | 'discussion' | 'ranking' | 'between' | 'nights' | 'decisions'
export type OfficePage = 'calls' | 'facility' | 'people' | 'fees' | 'mail' | 'logbook'

export type OfficeCallPage = 'rules' | 'nights' | 'between' | 'figures' | 'preview'
/** A form in which a panel's report is handed out. */
type ReportFileName = 'report.pdf' | 'report.csv'
/** A form in which a night plan is handed out. */
export type PlanFileName = 'nights.csv' | 'obsplan.csv' | 'nights.ics'

export const paths = {
  home: () => '/',
  calls: () => '/calls',
  call: (slug: string) => `/calls/${part(slug)}`,
  yardstick: () => '/tools/yardstick',
  season: () => '/tools/season',
  exposure: () => '/tools/exposure',
  help: () => '/help',
  helpMarks: () => '/help/marks',
  helpCalculations: () => '/help/calculations',
  /** Where the calculations for programs are described. */
  calculations: () => '/api/v1/openapi.json',

  signIn: (next?: string) => (next ? `/sign-in?next=${part(next)}` : '/sign-in'),
  register: () => '/register',
  confirm: (token: string) => `/confirm/${part(token)}`,
  forgotPassword: () => '/forgot-password',
  resetPassword: (token: string) => `/reset-password/${part(token)}`,
  invitation: (token: string) => `/invitations/${part(token)}`,
  account: () => '/account',
  accountData: () => '/account/data',

  proposals: () => '/proposals',
  newProposal: (callSlug?: string) => (callSlug ? `/proposals/new?call=${part(callSlug)}` : '/proposals/new'),
  proposal: (reference: string) => `/proposals/${part(reference)}`,
  proposalSection: (reference: string, section: ProposalSection) =>
    `/proposals/${part(reference)}/${section}`,
  proposalPaper: (reference: string, paper: number | string) =>
    `/proposals/${part(reference)}/papers/${part(String(paper))}`,
  /** Where a document is sent to, and the one that replaces it after the proposal was sent. */
  newPaper: (reference: string) => `/proposals/${part(reference)}/papers/new`,
  paperReplacement: (reference: string) => `/proposals/${part(reference)}/papers/replacement`,
  newFigure: (reference: string) => `/proposals/${part(reference)}/figures`,
  proposalFigure: (reference: string, figure: number | string, sha256: string) =>
    `/proposals/${part(reference)}/figures/${part(String(figure))}?v=${sha256.slice(0, 8)}`,
  proposalSent: (reference: string) => `/proposals/${part(reference)}/sent`,
  proposalHistory: (reference: string, since?: number) =>
    `/proposals/${part(reference)}/history${since === undefined ? '' : `?since=${since}`}`,
  proposalOutcome: (reference: string) => `/proposals/${part(reference)}/outcome`,
  proposalContinue: (reference: string) => `/proposals/${part(reference)}/continue`,
  proposalPacket: (reference: string, variant?: 'anonymised') =>
    `/proposals/${part(reference)}/packet${variant ? `?variant=${variant}` : ''}`,
  proposalRecord: (reference: string) => `/proposals/${part(reference)}/record`,
  proposalReceipt: (reference: string) => `/proposals/${part(reference)}/receipt`,
  /** An invoice or a credit note, by its number. */
  proposalBill: (reference: string, number: string) => `/proposals/${part(reference)}/bills/${part(number)}`,
  proposalCalendar: (reference: string) => `/proposals/${part(reference)}/calendar.ics`,
  proposalPaid: (reference: string) => `/proposals/${part(reference)}/paid`,

  assessments: () => '/assessments',
  assessment: (request: number | string) => `/assessments/${part(String(request))}`,
  ownInstruments: () => '/assessments/instruments',
  newOwnMode: () => '/assessments/instruments/new',
  ownMode: (slug: string) => `/assessments/instruments/${part(slug)}`,
  assessmentPacket: (request: number | string) => `/assessments/${part(String(request))}/packet`,

  assessmentReport: (request: number | string) => `/assessments/${part(String(request))}/report`,

  reviews: () => '/reviews',
  expertise: () => '/reviews/expertise',
  interests: (callSlug: string) => `/reviews/interests/${part(callSlug)}`,
  meeting: (callSlug: string) => `/reviews/meeting/${part(callSlug)}`,
  review: (assignment: number | string) => `/reviews/${part(String(assignment))}`,
  reviewReport: (assignment: number | string) => `/reviews/${part(String(assignment))}/report`,
  reviewPacket: (assignment: number | string) => `/reviews/${part(String(assignment))}/packet`,

  /** With the panel where its leader has another in the same call; without it, the first. */
  panel: (callSlug: string, page: PanelPage, panelId?: number) =>
    `/panel/${part(callSlug)}/${page}${panelId === undefined ? '' : `?panel=${panelId}`}`,
  panelPacket: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/packets/${part(reviewNumber)}`,

  panelPlan: (callSlug: string, file: PlanFileName, panelId: number) =>
    `/panel/${part(callSlug)}/plan/${file}?panel=${panelId}`,
  panelReportFile: (callSlug: string, file: ReportFileName, panelId: number) =>
    `/panel/${part(callSlug)}/report/${file}?panel=${panelId}`,
  panelTeam: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/teams/${part(reviewNumber)}`,
  panelReport: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/reports/${part(reviewNumber)}`,

  office: (page: OfficePage) => `/office/${page}`,
  letterSamples: () => '/office/mail/templates',
  letterSample: (template: string, reference: string) =>
    `/office/mail/templates/html?template=${part(template)}&reference=${part(reference)}`,
  bulkLetters: () => '/office/mail/letters',
  newBulkLetter: () => '/office/mail/letters/new',
  bulkLetter: (letter: number, reader?: number) =>
    `/office/mail/letters/${letter}${reader === undefined ? '' : `?reader=${reader}`}`,
  bulkLetterHtml: (letter: number, reader: number, version: number) =>
    `/office/mail/letters/${letter}/html?reader=${reader}&v=${version}`,
  officeLetter: (letter: number) => `/office/mail/${letter}`,
  officeLetterHtml: (letter: number) => `/office/mail/${letter}/html`,
  officePerson: (person: number) => `/office/people/${person}`,
  officeMerge: (person: number) => `/office/people/${person}/merge`,
  officePersonData: (person: number) => `/office/people/${person}/data`,
  officeFee: (reference: string) => `/office/fees?fee=${part(reference)}`,
  officeLedger: () => '/office/fees/ledger',
  officeInvoicing: () => '/office/fees/invoicing',
  officeReconciliation: () => '/office/fees/reconciliation',
  newRecord: (kind: 'sites' | 'telescopes' | 'instruments' | 'modes') => `/office/facility/${kind}/new`,
  retirement: (kind: 'site' | 'telescope' | 'instrument' | 'mode', slug: string) =>
    `/office/facility/retire/${kind}/${part(slug)}`,
  facilityRecord: (kind: 'sites' | 'telescopes' | 'modes', slug: string) =>
    `/office/facility/${kind}/${part(slug)}`,
  officePlan: (slug: string, file: PlanFileName) => `/office/calls/${part(slug)}/plan/${file}`,
  officeReportFile: (slug: string, file: ReportFileName, panelId: number) =>
    `/office/calls/${part(slug)}/report/${file}?panel=${panelId}`,
  officeCall: (slug: string) => `/office/calls/${part(slug)}`,
  officeCallPage: (slug: string, page: OfficeCallPage) => `/office/calls/${part(slug)}/${page}`,
  officeProposal: (slug: string, reference: string) =>
    `/office/calls/${part(slug)}/proposals/${part(reference)}`,
  officeDecisions: (slug: string) => `/office/calls/${part(slug)}/decisions`,

  api: {
    health: () => '/api/health',
    stripeWebhook: () => '/api/webhooks/stripe',
    table: (name: string) => `/api/tables/${name}`,
    reviewRecomputed: (assignment: number | string, cosmology: string) =>
      `/api/reviews/${part(String(assignment))}/recomputed?cosmology=${part(cosmology)}`,
  },
} as const

/** A return address from outside: only a path of ours is followed, never another site. */
export function ownPath(given: string | null | undefined, otherwise: string): string {
  if (!given || !/^\/(?![/\\])[^\s\\]*$/.test(given)) return otherwise
  return given
}
