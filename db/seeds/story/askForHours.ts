import { addObservation } from '../../../lib/domain/observations/addObservation.ts'
import { computeProposal } from '../../../lib/domain/observations/computeProposal.ts'
import { defaultConstraints } from '../../../lib/domain/observations/defaultConstraints.ts'
import { saveConstraintSet } from '../../../lib/domain/observations/saveConstraintSet.ts'
import { saveObservation } from '../../../lib/domain/observations/saveObservation.ts'
import { observationRowSchema } from '../../../lib/domain/observations/schema.ts'
import { readContents } from '../../../lib/domain/proposals/readContents.ts'
import type { Facility } from '../calls.ts'
import type { SeedProposal } from './proposalData.ts'
import type { Teller } from './teller.ts'

/** Magnitude from which a source counts as faint. */
export const faintFrom = 20

/** One observation a target, deep enough to need the hours the proposal is about. */
export async function askForHours(
  lead: Awaited<ReturnType<Teller['as']>>,
  reference: string,
  seed: SeedProposal,
  facility: Facility,
): Promise<void> {
  const modeId = facility.modeIds.get(seed.mode) ?? 0
  const isFaint = seed.magnitude[0] >= faintFrom
  const set = { ...defaultConstraints, ...(isFaint ? { name: 'Dark time', moon: 'dark' as const } : {}) }
  const { id: constraintSetId } = await saveConstraintSet(lead, { reference, id: null, version: 0, set })
  const row = (targetId: number, wantedSnr: number, askedHours: number) =>
    observationRowSchema.parse({
      targetId,
      modeId,
      constraintSetId,
      wantedSnr: wantedSnr.toFixed(1),
      snrPer: seed.line ? 'resolution-element' : 'image',
      feature: seed.line ?? '',
      ownName: '',
      ownRestA: '',
      askedHours: askedHours.toFixed(1),
    })
  const each = (seed.hours / seed.targets) * 3600
  const { targets } = await readContents(lead.db, reference)
  for (const target of targets) {
    let wanted = 10
    let observation = await addObservation(lead, { reference, row: row(target.id, wanted, each / 3600) })
    const save = async (askedHours: number) => {
      const change = { reference, id: observation.id, version: observation.version }
      observation = await saveObservation(lead, { ...change, row: row(target.id, wanted, askedHours) })
    }
    let possible = 0
    for (let round = 0; round < 9; round += 1) {
      const computed = computeProposal(await readContents(lead.db, reference))
      const needed = computed.observations.find((one) => one.observationId === observation.id)?.neededSeconds
      if (needed && (round > 5 || Math.abs(needed / each - 1) < 0.2)) {
        // Whoever needs more than the proposal is about asks for that much and no more.
        await save(Math.ceil(Math.min(needed, 1.2 * each) / 360) / 10)
        break
      }
      if (needed) {
        possible = wanted
        wanted *= Math.min(4, Math.max(0.4, Math.sqrt(each / needed)))
      } else {
        // The sky's own residue forbids this depth: go back towards one that can be reached.
        wanted = possible > 0 ? (round > 5 ? possible : (possible + wanted) / 2) : wanted * 0.6
      }
      await save(each / 3600)
    }
  }
}
