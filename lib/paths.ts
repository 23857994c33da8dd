/** Every address of the product. Nothing else writes one by hand. */
const part = encodeURIComponent

export type ProposalSection =
  'question' | 'targets' | 'cosmology' | 'observing' | 'feasibility' | 'people' | 'papers' | 'send'

export type PanelPage = 'assignments' | 'progress' | 'discussion' | 'ranking' | 'nights' | 'decisions'
export type OfficePage = 'calls' | 'facility' | 'people' | 'fees' | 'mail' | 'logbook'

export type OfficeCallPage = 'rules' | 'nights' | 'figures' | 'preview'

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

  proposals: () => '/proposals',
  newProposal: (callSlug?: string) => (callSlug ? `/proposals/new?call=${part(callSlug)}` : '/proposals/new'),
  proposal: (reference: string) => `/proposals/${part(reference)}`,
  proposalSection: (reference: string, section: ProposalSection) =>
    `/proposals/${part(reference)}/${section}`,
  proposalPaper: (reference: string, paper: number | string) =>
    `/proposals/${part(reference)}/papers/${part(String(paper))}`,
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
  proposalCalendar: (reference: string) => `/proposals/${part(reference)}/calendar.ics`,
  proposalPaid: (reference: string) => `/proposals/${part(reference)}/paid`,

  assessments: () => '/assessments',
  assessment: (request: number | string) => `/assessments/${part(String(request))}`,
  ownInstruments: () => '/assessments/instruments',
  ownMode: (slug: string) => `/assessments/instruments/${part(slug)}`,
  assessmentPacket: (request: number | string) => `/assessments/${part(String(request))}/packet`,

  assessmentReport: (request: number | string) => `/assessments/${part(String(request))}/report`,

  reviews: () => '/reviews',
  interests: (callSlug: string) => `/reviews/interests/${part(callSlug)}`,
  review: (assignment: number | string) => `/reviews/${part(String(assignment))}`,
  reviewReport: (assignment: number | string) => `/reviews/${part(String(assignment))}/report`,
  reviewPacket: (assignment: number | string) => `/reviews/${part(String(assignment))}/packet`,

  /** With the panel where its leader has another in the same call; without it, the first. */
  panel: (callSlug: string, page: PanelPage, panelId?: number) =>
    `/panel/${part(callSlug)}/${page}${panelId === undefined ? '' : `?panel=${panelId}`}`,
  panelPacket: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/packets/${part(reviewNumber)}`,

  panelTeam: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/teams/${part(reviewNumber)}`,
  panelReport: (callSlug: string, reviewNumber: string) =>
    `/panel/${part(callSlug)}/reports/${part(reviewNumber)}`,

  office: (page: OfficePage) => `/office/${page}`,
  facilityRecord: (kind: 'sites' | 'telescopes' | 'modes', slug: string) =>
    `/office/facility/${kind}/${part(slug)}`,
  officeCall: (slug: string) => `/office/calls/${part(slug)}`,
  officeCallPage: (slug: string, page: OfficeCallPage) => `/office/calls/${part(slug)}/${page}`,
  officeProposal: (slug: string, reference: string) =>
    `/office/calls/${part(slug)}/proposals/${part(reference)}`,

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
