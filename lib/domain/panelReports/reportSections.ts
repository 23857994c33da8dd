import {
  ABSENT,
  countInWords,
  formatHoursFromSeconds,
  formatList,
  formatNumber,
  formatPercent,
  formatUtc,
} from '@/lib/format'
import type { ReportSection } from '@/pdf/report/reportTypes'
import { greyZone, isGrey } from '../rankings/rules'
import { ruleHelp, ruleNames } from '../sharing/ruleWords'
import { rankedWords } from './rankedWords'
import type { ReportFacts } from './reportFacts'

const seats = { chair: 'chair', deputy: 'deputy', member: 'member' } as const

export function peopleSection({ desk, meeting }: ReportFacts): ReportSection {
  const here = meeting.members.filter(({ from }) => from !== null).length
  const { discussed } = meeting
  return {
    heading: 'Members and meeting',
    note: discussed
      ? `Proposals lay on the table from ${formatUtc(discussed.from)} to ${formatUtc(discussed.to)}; ${countInWords(discussed.proposals, 'was', 'were')} discussed. The meeting was announced for ${formatUtc(desk.call.panelMeetsAt)}.`
      : `The meeting was announced for ${formatUtc(desk.call.panelMeetsAt)}. No discussion was noted.`,
    facts: [
      { term: 'Members needed to decide', value: String(desk.panel.quorum) },
      {
        term: 'Noted as present',
        value: here === 0 ? 'presence was not noted' : `${here} of ${meeting.members.length}`,
        bold: here >= desk.panel.quorum,
      },
    ],
    table: {
      columns: [
        { head: 'Member', width: 221, bold: true },
        { head: 'Seat', width: 70 },
        { head: 'Here from', width: 110 },
        { head: 'Until', width: 110 },
      ],
      rows: meeting.members.map(({ name, seat, from, until }) => [
        ...[name, seats[seat], from ? formatUtc(from) : ABSENT],
        until ? formatUtc(until) : from ? 'the end' : ABSENT,
      ]),
    },
  }
}

export function conflictsSection({ meeting: { conflicts } }: ReportFacts): ReportSection {
  return {
    heading: 'Conflicts of interest',
    note: 'Whoever has an interest in a proposal neither sees nor discusses it, and does not count towards its quorum. Counts only: who and what stay with the office.',
    facts: [
      { term: 'Members kept from a proposal', value: String(conflicts.members) },
      { term: 'Proposals concerned', value: String(conflicts.proposals) },
      { term: 'Declared by the member', value: String(conflicts.declared) },
      { term: 'Found by matching people and institutes', value: String(conflicts.found) },
    ],
  }
}

export function scoringSection({ criteria, ranking }: ReportFacts): ReportSection {
  const whole = criteria.reduce((sum, { weight }) => sum + weight, 0)
  return {
    heading: 'How it was scored',
    note: `Each criterion from 0 to 10 in halves, 10 best; the score of a review is their weighted mean. ${countInWords(ranking.scores, 'score', 'scores', true)} from ${countInWords(ranking.reviewers, 'reviewer', 'reviewers')}, all given before discussion. The order began as that of the raw means.`,
    facts: criteria.map(({ title, weight }) => ({
      term: title,
      value: formatPercent(whole > 0 ? weight / whole : 0),
    })),
    lines: [
      ranking.corrected
        ? 'Merit is fitted with each reviewer’s leniency taken out (variances by REML, merit as best linear unbiased prediction).'
        : `Merit is fitted without taking leniency out${ranking.whyNot ? `: ${ranking.whyNot}` : '.'}`,
      `The chance of standing above the line, and the range of ranks that holds nine in ten draws, come from ${formatNumber(ranking.draws)} draws (seed ${ranking.seed}).`,
      ranking.formula.text
        ? `The panel’s own measure, fixed before scores were seen: ${ranking.formula.text}`
        : 'The panel laid down no measure of its own.',
    ],
  }
}

export function rankedSection({ rows, ranking }: ReportFacts): ReportSection {
  return {
    heading: 'The ranking',
    note: `Version ${ranking.list?.number ?? 0}, frozen ${ranking.list?.frozenAt ? formatUtc(new Date(ranking.list.frozenAt)) : ''}. The line stands after rank ${ranking.line} of ${rows.length}.`,
    table: {
      columns: [
        { head: 'Rank', width: 26, align: 'right' },
        { head: 'Number', width: 52, bold: true },
        { head: 'Title', width: 124 },
        { head: 'Raw', unit: 'mean', width: 32, align: 'right' },
        { head: 'Merit', unit: 'and shift', width: 66, align: 'right' },
        { head: 'Rank lies', unit: '9 in 10', width: 44, align: 'right' },
        { head: 'P above', unit: 'the line', width: 50, align: 'right' },
        { head: 'Asked', unit: 'h', width: 34, align: 'right' },
        { head: 'Given', unit: 'h', width: 34, align: 'right' },
        { head: 'Outcome', width: 49, align: 'right' },
      ],
      rows: rows.map(rankedWords),
    },
  }
}

export function greySection({ ranking }: ReportFacts): ReportSection {
  const zone = greyZone(ranking.rows.map(({ chance }) => chance))
  const grey = ranking.rows.filter(({ chance }) => isGrey(chance)).map(({ reviewNumber }) => reviewNumber)
  return {
    heading: 'The grey zone',
    note: zone
      ? `${formatList(grey)}, ${zone.first === zone.last ? `rank ${zone.first}` : `between ranks ${zone.first} and ${zone.last}`}, ${grey.length === 1 ? 'belongs' : 'belong'} above the line with 20 to 80 chances in 100: the scores did not decide, the panel did.`
      : 'No proposal belongs above the line with 20 to 80 chances in 100: the scores decided.',
  }
}

export function movesSection({ ranking }: ReportFacts): ReportSection {
  const moves = ranking.rows
    .flatMap(({ reviewNumber, moves: own }) => own.map((move) => ({ reviewNumber, ...move })))
    .sort((a, b) => a.at.localeCompare(b.at))
  if (moves.length === 0) return { heading: 'Changes by hand', note: 'No rank was changed by hand.' }
  return {
    heading: 'Changes by hand',
    table: {
      columns: [
        { head: 'Number', width: 52, bold: true },
        { head: 'Moved', width: 40 },
        { head: 'By', width: 95 },
        { head: 'When', width: 100 },
        { head: 'Reason', width: 224 },
      ],
      rows: moves.map((move) => [
        ...[move.reviewNumber, move.isUp ? 'up' : 'down', move.by ?? 'the panel'],
        ...[formatUtc(new Date(move.at)), move.reason],
      ]),
    },
  }
}

export function sharingSection({ sharing, desk }: ReportFacts): ReportSection | null {
  if (!sharing) return null
  const standing = sharing.written.find(({ isStanding }) => isStanding)
  const own = sharing.rows.filter((row) => row.panelId === desk.panel.id)
  const moves = own.flatMap((row) => row.moves.map((move) => ({ number: row.reviewNumber, ...move })))
  return {
    heading: 'Between panels',
    note: `Time is shared with the other panels of the call. ${ruleNames[sharing.rule]}: ${ruleHelp[sharing.rule]} ${standing ? `Laid down by ${standing.by}: ${standing.reason}` : 'Nobody laid down another rule.'}`,
    facts: sharing.pools.flatMap((pool) => {
      const part = pool.panels.find(({ panelId }) => panelId === desk.panel.id)
      return part
        ? [
            {
              term: `${pool.name}, share of ${formatHoursFromSeconds(pool.offeredSeconds)}`,
              value: `${formatHoursFromSeconds(part.shareSeconds)} for ${formatHoursFromSeconds(part.askedSeconds)} asked`,
            },
          ]
        : []
    }),
    lines: moves.map(
      (move) =>
        `${move.number} was moved ${move.isUp ? 'up' : 'down'} at the meeting of the panels by ${move.by ?? 'its chairs'}, ${formatUtc(new Date(move.at))}: ${move.reason}`,
    ),
  }
}

export function awardsSection({ rows }: ReportFacts): ReportSection {
  const lines = rows.flatMap(({ ranked, decision }) =>
    (decision?.lines ?? []).map((line) => ({ ranked, line })),
  )
  if (lines.length === 0) return { heading: 'Recommended awards', note: 'No time is given yet.' }
  return {
    heading: 'Recommended awards',
    table: {
      columns: [
        { head: 'Number', width: 52, bold: true },
        { head: 'Title', width: 180 },
        { head: 'Instrument', width: 70 },
        { head: 'Hours', width: 44, align: 'right' },
        { head: 'How', width: 55 },
        { head: 'Conditions', width: 110 },
      ],
      rows: lines.map(({ ranked, line }) => [
        ...[ranked.reviewNumber, ranked.title, line.instrument, formatNumber(line.seconds / 3600, 1)],
        ...[line.isReserve ? 'reserve' : line.service, line.conditions || 'none'],
      ]),
    },
  }
}

export function nightsSection({ telescopes, sharing }: ReportFacts): ReportSection {
  const hours = (seconds: number) => formatNumber(seconds / 3600, 1)
  return {
    heading: 'Nights',
    table: {
      columns: [
        { head: 'Telescope', width: 151, bold: true },
        {
          head: sharing ? 'Share of the dark time' : 'Dark time on offer',
          unit: 'h',
          width: 100,
          align: 'right',
        },
        { head: 'Held back', unit: 'h', width: 80, align: 'right' },
        { head: 'Given here', unit: 'h', width: 90, align: 'right' },
        { head: 'In reserve', unit: 'h', width: 90, align: 'right' },
      ],
      rows: telescopes.map((one) => [
        ...[one.name, hours(one.offeredSeconds), hours(one.heldSeconds)],
        ...[hours(one.givenSeconds), hours(one.reserveSeconds)],
      ]),
    },
  }
}

export function countsSection({ counts }: ReportFacts): ReportSection {
  return {
    heading: 'Statistics',
    note: 'Counts of one to four are kept back, and as many others that no sum gives one away.',
    table: {
      columns: [
        { head: 'Kind of proposal', width: 191, bold: true },
        { head: 'Awarded', width: 80, align: 'right' },
        { head: 'Reserve', width: 80, align: 'right' },
        { head: 'Declined', width: 80, align: 'right' },
        { head: 'All', width: 80, align: 'right' },
      ],
      rows: counts.map(({ kind, cells }) => [
        kind,
        ...cells.map((count) => (count === null ? 'kept back' : String(count))),
      ]),
    },
  }
}

export function agreementSection({ ranking: { agreement } }: ReportFacts): ReportSection {
  if (!agreement)
    return { heading: 'Agreement', note: 'There are too few scores to say how far reviewers agree.' }
  return {
    heading: 'Agreement',
    facts: [
      { term: 'Intraclass correlation of one review', value: formatNumber(agreement.single, 2) },
      {
        term: `Of the mean of ${formatNumber(agreement.meanReviews, 1)} reviews`,
        value: formatNumber(agreement.mean, 2),
        bold: true,
      },
      { term: 'Krippendorff’s alpha, interval', value: formatNumber(agreement.alpha, 2) },
      { term: 'Left over in one score', value: `${formatNumber(agreement.leftOver, 2)} points` },
    ],
  }
}
