import { randomUUID } from 'node:crypto'
import { modes } from '../facilityData.ts'
import { addInvestigator } from '../../../lib/domain/proposals/addInvestigator.ts'
import { beginProposal } from '../../../lib/domain/proposals/beginProposal.ts'
import { confirmMembership } from '../../../lib/domain/proposals/confirmMembership.ts'
import { describeInvestigator } from '../../../lib/domain/proposals/describeInvestigator.ts'
import { markSectionDone } from '../../../lib/domain/proposals/markSectionDone.ts'
import { saveQuestion } from '../../../lib/domain/proposals/saveQuestion.ts'
import { saveQuestionSchema, sections } from '../../../lib/domain/proposals/schema.ts'
import { readContents } from '../../../lib/domain/proposals/readContents.ts'
import { instrumentsUsed } from '../../../lib/domain/submission/rules.ts'
import { saveGroup } from '../../../lib/domain/targetGroups/saveGroup.ts'
import { addTarget } from '../../../lib/domain/targets/addTarget.ts'
import { targetRowSchema, type TargetRow } from '../../../lib/domain/targets/schema.ts'
import { emptyTargetRow } from '../../../lib/domain/targets/targetRow.ts'
import { computeProposal } from '../../../lib/domain/observations/computeProposal.ts'
import { saveWish } from '../../../lib/domain/wishes/saveWish.ts'
import { restLines } from '../../../lib/science/light/index.ts'
import { submitProposal } from '../../../lib/domain/submission/submitProposal.ts'
import { formatDeclination, formatRightAscension } from '../../../lib/format/sexagesimal.ts'
import type { SeededCall } from '../calls.ts'
import type { Facility } from '../calls.ts'
import { askForHours, faintFrom } from './askForHours.ts'
import { justify } from './justify.ts'
import type { SeedProposal } from './proposalData.ts'
import type { Dice } from './random.ts'
import type { Teller } from './teller.ts'

export interface WriteOptions {
  call: SeededCall
  facility: Facility
  /** Right ascensions that cross the meridian in the dark of that season, hours. */
  raHours: [number, number]
  begunAt: Date
  /** Null leaves a draft. */
  sentAt: Date | null
}

const abstractOf = (seed: SeedProposal, hours: number) =>
  `We ask for ${hours.toFixed(1)} hours to settle a question that the present data leave open. ${seed.title}: with ${seed.targets === 1 ? 'one target' : `${seed.targets} targets`} at z of ${seed.redshift[0]} to ${seed.redshift[1]} we measure one quantity in the same way throughout, to a depth that decides between the two readings in the literature. Each target stands alone, so that a part of the time gives a part of the answer.`

/** Faint sources are asked for in their line, whose flux follows from a luminosity of the order of those published. */
function lineOf(seed: SeedProposal, chance: Dice): Partial<TargetRow> {
  const line = restLines.find(({ id }) => id === seed.line)
  if (line?.nature !== 'emission' || seed.magnitude[0] < faintFrom) return {}
  const luminosity = 10 ** chance.between(41.9, 42.4)
  return {
    lineName: line.name,
    lineKind: 'luminosity',
    lineValue: luminosity.toPrecision(3),
    lineError: (0.2 * luminosity).toPrecision(2),
    lineWidth: '250',
  }
}

/** What is awaited has no position. */
function awaitedCells({ awaited }: SeedProposal): Partial<TargetRow> {
  if (!awaited) return {}
  return {
    ...{ name: awaited.name, event: awaited.event, trigger: awaited.trigger, ra: '', dec: '' },
    reaction: String(awaited.reactionHours),
    triggers: String(awaited.triggers),
    // Of a kind, not of one: any of them may be nearer or brighter.
    ...{ redshiftType: 'assumed', redshiftError: '0.01', magnitudeError: '0.4' },
  }
}

/** A declination that never rises far enough over the site. */
const neverUpDeg = 58

function targetRow(seed: SeedProposal, chance: Dice, raHours: [number, number], isLast: boolean) {
  const raDeg = (chance.between(...raHours) * 15 + 360) % 360
  const drawnDeg = chance.between(-62, 2)
  const decDeg = seed.group && isLast ? neverUpDeg : drawnDeg
  const ra = formatRightAscension(raDeg, 2)
  const dec = formatDeclination(decDeg, 1)
  const digits = (text: string) => text.replace(/\s/g, '')
  const band =
    modes.find((mode) => mode.slug === seed.mode)?.band ??
    (seed.mode.startsWith('ember') ? 'J' : seed.mode === 'spindle-blue' ? 'g' : 'r')
  const redshift = chance.between(...seed.redshift)
  const row: TargetRow = {
    ...emptyTargetRow,
    name: `QR J${digits(ra).slice(0, 4)}${digits(dec).slice(0, 5)}`,
    ra,
    dec,
    redshift: redshift.toFixed(4),
    redshiftError: (0.0003 * (1 + redshift)).toFixed(4),
    magnitude: chance.between(...seed.magnitude).toFixed(2),
    magnitudeError: '0.08',
    band: `${band} AB`,
    ...lineOf(seed, chance),
    ...awaitedCells(seed),
  }
  return targetRowSchema.parse(row)
}

/** Writes a proposal from its first line as its investigators would, and sends it unless it is to stay a draft. */
export async function writeProposal(
  story: Teller,
  chance: Dice,
  seed: SeedProposal,
  options: WriteOptions,
): Promise<string> {
  const { call, facility } = options
  await story.at(options.begunAt)
  const lead = await story.as(seed.lead)
  const kindId = call.kindIds.get(seed.kind ?? 'regular') ?? 0
  const { reference } = await beginProposal(lead, { kindId, title: seed.title })
  const version = async () => (await readContents(lead.db, reference)).version
  for (const name of seed.with) {
    const other = await story.as(name)
    await addInvestigator(lead, {
      reference,
      name,
      email: other.actor.email,
      institute: '',
      access: 'edit',
      orcid: '',
      isStudent: false,
      isSupervisor: seed.kind === 'thesis',
    })
    await confirmMembership(other, { reference })
  }
  if (seed.kind === 'thesis') await nameStudent(lead, reference)
  for (let n = 0; n < seed.targets; n += 1)
    await addTarget(lead, {
      reference,
      row: targetRow(seed, chance, options.raHours, n === seed.targets - 1),
    })
  if (seed.group) await makeGroup(lead, reference, seed.group)
  await askForHours(lead, reference, seed, facility)
  if (seed.visit) await wishForVisit(lead, reference, seed.visit)
  const hours = computeProposal(await readContents(lead.db, reference)).askedSeconds / 3600
  await saveQuestion(
    lead,
    saveQuestionSchema.parse({
      reference,
      version: await version(),
      title: seed.title,
      abstract: abstractOf(seed, hours),
      category: seed.category,
    }),
  )
  await justify(lead, reference, seed)
  for (const section of sections) await markSectionDone(lead, { reference, section, done: true })
  if (options.sentAt) {
    await story.at(options.sentAt)
    await submitProposal(lead, {
      reference,
      idempotencyKey: randomUUID(),
      declaration: true,
      arrivedAt: options.sentAt,
    })
  }
  return reference
}

/** Who leads a thesis is the student. */
async function nameStudent(lead: Awaited<ReturnType<Teller['as']>>, reference: string): Promise<void> {
  const [student] = (await readContents(lead.db, reference)).people
  if (!student) return
  const { id, institute, version } = student
  await describeInvestigator(lead, {
    reference,
    id,
    version,
    institute,
    orcid: '',
    isStudent: true,
    isSupervisor: false,
  })
}

async function makeGroup(
  lead: Awaited<ReturnType<Teller['as']>>,
  reference: string,
  { name, atLeast }: { name: string; atLeast: number },
): Promise<void> {
  const { targets } = await readContents(lead.db, reference)
  const group = { name, rule: 'at-least', atLeast, hoursFor: 'all' } as const
  await saveGroup(lead, {
    ...{ reference, id: null, version: 0 },
    group: { ...group, targetIds: targets.map(({ id }) => id) },
  })
}

async function wishForVisit(
  lead: Awaited<ReturnType<Teller['as']>>,
  reference: string,
  visit: NonNullable<SeedProposal['visit']>,
): Promise<void> {
  const { modes: offered, observations } = await readContents(lead.db, reference)
  for (const instrumentId of instrumentsUsed({ modes: offered, observations }))
    await saveWish(lead, { reference, instrumentId, version: 0, wish: { leastSeconds: null, visit } })
}
