import { render, screen } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { expect, it, vi } from 'vitest'
import { ScoresAtTable } from '@/components/discussions/ScoresAtTable'
import { saveText } from '@/components/tables/saveText'
import type { TableView } from '@/lib/domain/discussions/tableView'

// Seen to fail with the means left out of the file.

vi.mock('@/components/tables/saveText', () => ({ saveText: vi.fn() }))

const view: TableView = {
  ...{ panelId: 1, panelName: 'Distant universe', callSlug: 'call-13', callNumber: 13, quorum: 3 },
  me: { personId: 1, isPresent: true, leads: true },
  ...{ present: 3, members: [], status: 'now', since: null, own: null },
  proposal: { proposalId: 5, reviewNumber: '13-083', title: 'Hosts', lines: [] },
  scores: [
    { reviewer: 2, before: 7.25, after: 8 },
    { reviewer: 4, before: 6, after: null },
  ],
  ...{ meanBefore: 6.625, meanAfter: 7 },
}

it('gives the scores on the table as a file, the means last', async () => {
  render(<ScoresAtTable view={view} />)
  await userEvent.click(screen.getByRole('button', { name: 'Scores as CSV' }))
  expect(vi.mocked(saveText).mock.calls).toEqual([
    ['scores-13-083.csv', 'Reviewer,First,Now,Shift\r\n2,7.25,8,0.75\r\n4,6,,\r\nMean,6.625,7,0.375\r\n'],
  ])
})
