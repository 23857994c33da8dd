import type { Role } from '../domain/actor'

/** Who may knock: a verb still asks its policy about this proposal, this assignment, this moment. */
export type Who = 'anyone' | 'signed-in' | readonly Role[]

const investigator = ['investigator'] as const
const scientist = ['instrument-scientist'] as const
const reviewer = ['reviewer'] as const
const chair = ['chair'] as const
const office = ['office'] as const

/**
 * The access matrix. `openPage`, `defineRoute` and `defineAction` read it at run time; a test walks the
 * tree and fails on any page, handler or action that is not listed. Deny by default.
 */
export const access = {
  pages: {
    '/': 'anyone',
    '/calls': 'anyone',
    '/calls/[slug]': 'anyone',
    '/tools/yardstick': 'anyone',
    '/tools/season': 'anyone',
    '/tools/exposure': 'anyone',
    '/help': 'anyone',
    '/help/marks': 'anyone',
    '/sign-in': 'anyone',
    '/register': 'anyone',
    '/confirm/[token]': 'anyone',
    '/forgot-password': 'anyone',
    '/reset-password/[token]': 'anyone',
    '/invitations/[token]': 'anyone',
    '/account': 'signed-in',
    '/proposals': investigator,
    '/proposals/new': investigator,
    '/proposals/[reference]': investigator,
    '/proposals/[reference]/question': investigator,
    '/proposals/[reference]/targets': investigator,
    '/proposals/[reference]/cosmology': investigator,
    '/proposals/[reference]/observing': investigator,
    '/proposals/[reference]/feasibility': investigator,
    '/proposals/[reference]/people': investigator,
    '/proposals/[reference]/papers': investigator,
    '/proposals/[reference]/send': investigator,
    '/proposals/[reference]/sent': investigator,
    '/proposals/[reference]/history': investigator,
    '/proposals/[reference]/outcome': investigator,
    '/assessments': scientist,
    '/assessments/[request]': scientist,
    '/reviews': reviewer,
    '/reviews/interests/[call]': reviewer,
    '/reviews/[assignment]': reviewer,
    '/panel/[call]/assignments': chair,
    '/panel/[call]/progress': chair,
    '/panel/[call]/discussion': chair,
    '/panel/[call]/ranking': chair,
    '/panel/[call]/nights': chair,
    '/panel/[call]/decisions': chair,
    '/office/calls': office,
    '/office/calls/[slug]': office,
    '/office/facility': office,
    '/office/people': office,
    '/office/fees': office,
    '/office/mail': office,
    '/office/logbook': office,
  },
  routes: {
    'GET /api/health': 'anyone',
    'POST /api/webhooks/stripe': 'anyone',
    'GET /proposals/[reference]/packet': ['investigator', 'office'],
    'GET /proposals/[reference]/record': ['investigator', 'office'],
    'GET /proposals/[reference]/receipt': ['investigator', 'office'],
    'GET /proposals/[reference]/calendar.ics': investigator,
    'GET /proposals/[reference]/paid': investigator,
    'GET /assessments/[request]/packet': scientist,
    'GET /reviews/[assignment]/packet': reviewer,
    'GET /panel/[call]/packets/[number]': chair,
    'GET /api/v1/cosmologies': 'anyone',
    'POST /api/v1/cosmology': 'anyone',
    'POST /api/v1/cosmology/inverse': 'anyone',
    'POST /api/v1/sky/positions': 'anyone',
    'POST /api/v1/sky/visibility': 'anyone',
    'POST /api/v1/exposure/ccd': 'anyone',
    'GET /api/tables/assessments': scientist,
    'GET /api/tables/reviews': reviewer,
    'GET /api/reviews/[assignment]/recomputed': reviewer,
  },
  actions: {
    addTarget: investigator,
    saveTarget: investigator,
    removeTarget: investigator,
    restoreTarget: investigator,
    reorderTargets: investigator,
    importTargets: investigator,
    addObservation: investigator,
    saveObservation: investigator,
    saveAskedTimes: investigator,
    removeObservation: investigator,
    saveConstraintSet: investigator,
    sendProposal: investigator,
    reopenProposal: investigator,
    withdrawProposal: investigator,
    startPayment: investigator,
    askForWaiver: investigator,
    assessRequest: scientist,
    askQuestion: scientist,
    passToPanel: scientist,
    answerQuestion: investigator,
    declareInterests: reviewer,
    saveScore: reviewer,
    saveReviewText: reviewer,
    finishReview: reviewer,
    reopenReview: reviewer,
    register: 'anyone',
    confirmAddress: 'anyone',
    askForReset: 'anyone',
    resetPassword: 'anyone',
    acceptInvitation: 'anyone',
    acceptAsSelf: 'signed-in',
    saveProfile: 'signed-in',
    changePassword: 'signed-in',
    endOtherSessions: 'signed-in',
  },
} as const satisfies {
  pages: Record<string, Who>
  routes: Record<string, Who>
  actions: Record<string, Who>
}

export type PagePath = keyof (typeof access)['pages']
export type RouteName = keyof (typeof access)['routes']
export type ActionName = keyof (typeof access)['actions']
