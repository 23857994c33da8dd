/** One account as the office sees it. Times are ISO, UTC. */
export interface PersonView {
  id: number
  name: string
  email: string
  institute: string
  orcid: string | null
  createdAt: string
  confirmedAt: string | null
  disabledAt: string | null
  addressFailedAt: string | null
  addressFailedWhy: string | null
  erasureAskedAt: string | null
  erasedAt: string | null
  mergedInto: { id: number; name: string } | null
  traces: {
    proposals: number
    sent: number
    reviews: number
    assessments: number
    letters: number
    lastSeenAt: string | null
  }
  grants: GrantView[]
}

export interface GrantView {
  id: number
  role: string
  call: number | null
  panel: string | null
  instrument: string | null
  fromAt: string
  untilAt: string | null
  grantedBy: string | null
  /** `holds` now; `to come`; `over` by its date; `ended` by the office. */
  stands: 'holds' | 'to come' | 'over' | 'ended'
}
