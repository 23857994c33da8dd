import type { Actor } from '@/lib/domain/actor'
import { holds } from '@/lib/domain/actor'
import { paths, type PanelPage } from '@/lib/paths'
import type { HeaderLink } from './HeaderNav'

export type Area = 'public' | 'investigator' | 'scientist' | 'reviewer' | 'chair' | 'office'

interface Desk extends HeaderLink {
  area: Area
}

/** The desks a person has, by the roles they hold; the panel's is that of the current call. */
export function desksOf(actor: Actor | null, panelCall: string | null): Desk[] {
  if (!actor) return []
  const desks: Desk[] = []
  if (holds(actor, 'investigator'))
    desks.push({ area: 'investigator', href: paths.proposals(), label: 'Proposals' })
  if (holds(actor, 'reviewer')) desks.push({ area: 'reviewer', href: paths.reviews(), label: 'Reviews' })
  if (holds(actor, 'instrument-scientist'))
    desks.push({ area: 'scientist', href: paths.assessments(), label: 'Assessments' })
  if (holds(actor, 'chair') && panelCall)
    desks.push({ area: 'chair', href: paths.panel(panelCall, 'assignments'), label: 'Panel' })
  if (holds(actor, 'office')) desks.push({ area: 'office', href: paths.office('calls'), label: 'Office' })
  return desks
}

const tools: readonly HeaderLink[] = [
  { href: paths.calls(), label: 'Calls' },
  { href: paths.yardstick(), label: 'Yardstick' },
  { href: paths.season(), label: 'Season' },
  { href: paths.exposure(), label: 'Exposure' },
]

const officeLinks: readonly HeaderLink[] = [
  { href: paths.office('calls'), label: 'Calls' },
  { href: paths.office('facility'), label: 'Facility' },
  { href: paths.office('people'), label: 'People' },
  { href: paths.office('fees'), label: 'Fees' },
  { href: paths.office('mail'), label: 'Mail' },
  { href: paths.office('logbook'), label: 'Logbook' },
]

function panelLinks(call: string): HeaderLink[] {
  const link = (page: PanelPage, label: string): HeaderLink => ({
    href: paths.panel(call, page),
    label,
    carries: ['panel'],
  })
  return [
    link('assignments', 'Assignments'),
    link('progress', 'Progress'),
    link('ranking', 'Ranking'),
    link('discussion', 'Discussion'),
    link('nights', 'Nights'),
    link('decisions', 'Decisions'),
  ]
}

const help: HeaderLink = { href: paths.help(), label: 'Help' }

/** What the head of a page offers: the links of the area, and the other desks beside Help. */
export function headerLinks(
  area: Area,
  actor: Actor | null,
  panelCall: string | null,
): { links: HeaderLink[]; asideLinks: HeaderLink[] } {
  const desks = desksOf(actor, panelCall)
  if (area === 'office' || area === 'chair') {
    const links = area === 'office' ? [...officeLinks] : panelLinks(panelCall ?? '')
    return { links, asideLinks: [...desks.filter((desk) => desk.area !== area), help] }
  }
  return { links: [...desks, ...tools], asideLinks: [help] }
}
