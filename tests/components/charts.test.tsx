import { fireEvent, render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { describe, expect, it, vi } from 'vitest'
import { AskedBar } from '@/components/charts/AskedBar'
import { ChanceBar } from '@/components/charts/ChanceBar'
import { ChartFrame } from '@/components/charts/ChartFrame'
import { HoursBar } from '@/components/charts/HoursBar'
import { LineChart } from '@/components/charts/LineChart'
import { MonthSparkline } from '@/components/charts/MonthSparkline'
import { RankInterval } from '@/components/charts/RankInterval'
import { SeasonChart } from '@/components/charts/SeasonChart'
import { seasonMoons } from '@/components/charts/seasonMoons'
import { UpBars } from '@/components/charts/UpBars'
import { seasonPicture } from '@/components/charts/geometry/season'
import { moonPhases, seasonGrid } from '@/lib/science/sky'

// Seen to fail with the table twin left out of ChartFrame, and with the snap of LineChart left out.

const ridge = { latitudeDeg: -37.4, longitudeDeg: -70.2, elevationM: 2390 }

describe('a chart', () => {
  it('has its numbers one press away', async () => {
    const user = userEvent.setup()
    render(
      <ChartFrame
        title="Dark hours"
        fileName="dark"
        numbers={{
          caption: 'Dark hours by night',
          columns: [{ head: 'Evening' }, { head: 'Dark', unit: 'h', decimals: 1 }],
          rows: [
            ['2027-07-01', 11.23],
            ['2027-07-02', null],
          ],
        }}
      >
        <p>the drawing</p>
      </ChartFrame>,
    )
    expect(screen.queryByRole('table')).toBeNull()
    await user.click(screen.getByRole('button', { name: 'These numbers as a table' }))
    const table = screen.getByRole('table', { name: 'Dark hours by night' })
    expect(
      within(table)
        .getAllByRole('cell')
        .map((cell) => cell.textContent),
    ).toEqual(['2027-07-01', '11.2', '2027-07-02', '–'])
    await user.click(screen.getByRole('button', { name: 'Hide the table' }))
    expect(screen.queryByRole('table')).toBeNull()
  })
})

describe('lines', () => {
  const series = [
    {
      id: 'planck',
      name: 'Planck 2018',
      tone: 's1' as const,
      points: [
        [0, 0],
        [2, 20],
      ] as const,
    },
    {
      id: 'ladder',
      name: 'Local ladder',
      tone: 's2' as const,
      points: [
        [0, 0],
        [2, 18],
      ] as const,
    },
  ]

  it('are named beside, and read off by arrow keys or pointer, snapping to one’s own values', () => {
    const onPoint = vi.fn()
    render(
      <LineChart
        label="Distance against redshift."
        series={series}
        xLabel="z"
        marks={[1.05]}
        yDecimals={2}
        onPoint={onPoint}
      />,
    )
    const chart = screen.getByRole('img', { name: /^Distance against redshift/ })
    expect(within(chart).getByText('Planck 2018')).toBeTruthy()
    chart.getBoundingClientRect = () => new DOMRect(0, 0, 640, 320)
    // Plot from 64 to 508 for z from 0 to 2: z = 1.05 lies at 297.1.
    fireEvent(chart, new MouseEvent('pointermove', { clientX: 294, bubbles: true }))
    expect(onPoint).toHaveBeenLastCalledWith(1.05)
    expect(within(chart).getByText('10.50')).toBeTruthy()
    expect(within(chart).getByText('9.45')).toBeTruthy()
    fireEvent.blur(chart)
    expect(onPoint).toHaveBeenLastCalledWith(null)
    fireEvent.keyDown(chart, { key: 'ArrowRight' })
    expect(onPoint.mock.lastCall?.[0]).toBeCloseTo(0.04, 6)
  })
})

describe('a season', () => {
  it('draws a column a night and the Moon by its names', () => {
    const grid = seasonGrid(ridge, '2027-07-01', '2027-07-31', -3)
    const phases = moonPhases(new Date('2027-07-01T00:00:00Z'), new Date('2027-07-31T23:00:00Z'))
    render(
      <SeasonChart
        label="Nights of July 2027"
        picture={seasonPicture(grid)}
        moons={seasonMoons(phases, '2027-07-01', 31, -3)}
        target={{ windows: grid.nights.map(() => [[24, 30]] as const) }}
        notes={[{ night: 3, hour: 26, words: '11.2 h of dark' }]}
        monthValues={['138.3 h']}
      />,
    )
    const chart = screen.getByRole('img', { name: 'Nights of July 2027' })
    expect(chart.querySelectorAll('linearGradient').length).toBe(62)
    for (const words of ['new 4', 'full 18', '11.2 h of dark', 'July']) {
      expect(within(chart).getByText(words)).toBeTruthy()
    }
  })
})

describe('marks in tables', () => {
  it.each([
    [
      'rank 13 by merit, 90 % between 9 and 20; rank 12 by raw mean',
      <RankInterval
        key="r"
        count={24}
        line={12}
        merit={13}
        raw={12}
        low={9}
        high={20}
        lowerHalf={11}
        upperHalf={16}
        zone={[9, 18]}
        grey
      />,
    ],
    [
      '34.5 of 54.0 hours',
      <HoursBar key="h" asked={54} given={34.5} least={30} maxHours={110} side="left" />,
    ],
    [
      'true 2.9 h, computed 2.8 h, asked 3.0 h',
      <AskedBar key="a" trueHours={2.9} computedHours={2.8} askedHours={3} maxHours={4} />,
    ],
    [
      '2027-07 138 h, 2027-08 189 h',
      <MonthSparkline
        key="m"
        months={[
          { month: '2027-07', sum: 138.3 },
          { month: '2027-08', sum: 188.6 },
        ]}
      />,
    ],
  ])('say %s', (name, mark) => {
    render(mark)
    expect(screen.getByRole('img').getAttribute('aria-label')?.replaceAll('\u00a0', ' ')).toBe(name)
  })

  it.each([
    [0.999, '> 0.99'],
    [0.99, '0.99'],
    [0.27, '0.27'],
    [0.001, '< 0.01'],
  ])('write a chance of %s as %s', (chance, text) => {
    render(<ChanceBar chance={chance} />)
    expect(screen.getByText(text)).toBeTruthy()
  })

  it('list when targets are up, with their sums', () => {
    render(
      <UpBars
        label="When your targets are up"
        months={[{ name: 'July', count: 3 }]}
        rows={[{ name: 'HE 0435−1223', byNight: [0, 2, 4], totalHours: 652.1, tone: 'not-feasible' }]}
      />,
    )
    const chart = screen.getByRole('img', { name: 'When your targets are up' })
    expect(chart.textContent?.replaceAll('\u00a0', ' ')).toContain('652.1 h')
  })
})
