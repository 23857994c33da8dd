import { formatUtcWithYear } from '@/lib/format'
import { seasonWords } from '@/pdf/packet/packetData'
import type { ReportData } from '@/pdf/report/reportTypes'
import type { ReportFacts } from './reportFacts'
import {
  agreementSection,
  awardsSection,
  conflictsSection,
  countsSection,
  greySection,
  movesSection,
  nightsSection,
  peopleSection,
  rankedSection,
  scoringSection,
  sharingSection,
} from './reportSections'

/** The report of a panel in words, section by section. */
export function reportData(facts: ReportFacts): ReportData {
  const { desk, observatory } = facts
  const { call, panel } = desk
  return {
    ...{ observatory, season: seasonWords(call.seasonFrom, call.seasonTo) },
    label: `Report of the panel, call ${call.number}`,
    title: panel.name,
    sentence: `As things stood on ${formatUtcWithYear(desk.now)}, for the chair and the office. Proposals by review number, reviewers not by name. What its reader has an interest in is not in this file.`,
    sections: [
      peopleSection(facts),
      conflictsSection(facts),
      scoringSection(facts),
      rankedSection(facts),
      greySection(facts),
      movesSection(facts),
      ...[sharingSection(facts)].flatMap((section) => section ?? []),
      awardsSection(facts),
      nightsSection(facts),
      countsSection(facts),
      agreementSection(facts),
    ],
    footer: {
      left: 'For the chair and the office; not for the panel or investigators',
      right: `Call ${call.number}, ${panel.name}`,
    },
  }
}
