import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { cleanup, render, screen, waitFor } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { NuqsTestingAdapter } from 'nuqs/adapters/testing'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import { OfficeDecisions } from '@/components/decisions/OfficeDecisions'
import type { DecisionRow } from '@/lib/domain/decisions/decisionsView'
import type { OfficeDecisionsView } from '@/lib/domain/decisions/officeDecisionsView'

vi.mock('next/navigation', async (original) => ({
  ...(await original<object>()),
  useRouter: () => ({ refresh: () => undefined }),
}))

const row = (id: number, isOpened: boolean): DecisionRow => ({
  proposalId: id,
  reviewNumber: `13-00${id}`,
  title: `Question ${id}`,
  rank: id,
  isAbove: true,
  outcome: 'awarded',
  lines: [],
  askedSeconds: 3600,
  statement: `Statement ${id}`,
  version: 4,
  isPrepared: true,
  releasedAt: null,
  flags: [],
  comments: [],
  approval: 'waits',
  approvedBy: null,
  whyNotApproved: null,
  isOpened,
})

let rows: DecisionRow[]
const view = (): OfficeDecisionsView => ({
  callNumber: 13,
  callSlug: 'call-13',
  phase: 'ranking',
  lettersAt: '2027-06-01T12:00:00Z',
  panels: [{ panelId: 7, name: 'The panel', isFrozen: true, rows }],
})
const approve = vi.fn(async () => ({ ok: true as const, data: { approved: rows.length } }))
const opened = vi.fn(async ({ proposalId }: { proposalId: number }) => {
  rows = rows.map((one) => (one.proposalId === proposalId ? { ...one, isOpened: true } : one))
  return { ok: true as const, data: undefined }
})

beforeEach(() => {
  rows = [row(1, false), row(2, true), row(3, false)]
  vi.stubGlobal(
    'fetch',
    vi.fn(async () => Response.json(view())),
  )
  render(
    <NuqsTestingAdapter>
      <QueryClientProvider client={new QueryClient()}>
        <OfficeDecisions initial={view()} approve={approve} openDecision={opened} />
      </QueryClientProvider>
    </NuqsTestingAdapter>,
  )
})
afterEach(() => {
  cleanup()
  vi.clearAllMocks()
  vi.unstubAllGlobals()
})

describe('the second person', () => {
  it('goes through what was not opened, and only then approves all', async () => {
    const user = userEvent.setup()
    expect(screen.queryByRole('button', { name: /^Approve all/ })).toBeNull()
    await user.click(screen.getByRole('button', { name: 'Which are left' }))
    expect(screen.getAllByRole('button', { name: /^13-00[13]$/ })).toHaveLength(4)
    await user.keyboard('{Escape}')

    await user.click(screen.getByRole('button', { name: 'Open the next of 2 to read' }))
    expect(await screen.findByText('Statement 1')).toBeDefined()
    expect(document.activeElement?.textContent).toBe('13-001')
    await waitFor(() => expect(opened).toHaveBeenCalledWith({ panelId: 7, proposalId: 1, version: 4 }))
    await screen.findByRole('button', { name: 'Open the next of 1 to read' })

    await user.click(screen.getByRole('button', { name: 'Open the next to read' }))
    expect(await screen.findByText('Statement 3')).toBeDefined()
    await user.click(await screen.findByRole('button', { name: 'Approve all 3 as they stand' }))
    expect(approve).toHaveBeenCalledWith({
      panelId: 7,
      decisions: [1, 2, 3].map((proposalId) => ({ proposalId, version: 4 })),
    })
    expect(opened).toHaveBeenCalledTimes(2)
  })

  it('is asked to read again what changed while it was open', async () => {
    const user = userEvent.setup()
    await user.click(screen.getByRole('button', { name: 'Open the next of 2 to read' }))
    await waitFor(() => expect(opened).toHaveBeenCalledTimes(1))
    rows = rows.map((one) =>
      one.proposalId === 1 ? { ...one, version: 5, statement: 'Another', isOpened: false } : one,
    )
    await user.click(screen.getByRole('button', { name: 'Open the next to read' }))
    await user.click(await screen.findByRole('button', { name: 'Open the next of 1 to read' }))
    await waitFor(() => expect(opened).toHaveBeenLastCalledWith({ panelId: 7, proposalId: 1, version: 5 }))
  })
})
