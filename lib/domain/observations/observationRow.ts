import { restLines } from '@/lib/science/light'
import type { ModeRecord } from '../facility/types'
import type { Observation } from '../proposals/types'
import type { ObservationRow } from './schema'

/** Hours of a whole number of seconds as people type them: no more decimals than they say something. */
export const hoursText = (seconds: number): string => String(Math.round((seconds / 3600) * 1000) / 1000)

/** A kept observation as the text of its row. */
export function observationRow(
  observation: Omit<Observation, 'id' | 'version' | 'position'>,
): ObservationRow {
  const { feature, featureRestA } = observation
  const line = restLines.find(({ name, vacuumA }) => name === feature && vacuumA === featureRestA)
  return {
    targetId: observation.targetId,
    modeId: observation.modeId,
    constraintSetId: observation.constraintSetId,
    wantedSnr: String(observation.wantedSnr),
    snrPer: observation.snrPer,
    feature: line ? line.id : feature === null ? '' : 'own',
    ownName: line ? '' : (feature ?? ''),
    ownRestA: line || featureRestA === null ? '' : String(featureRestA),
    askedHours: hoursText(observation.askedSeconds),
  }
}

/** What a new observation of a target begins with: an image's S/N, or a spectrum's by resolution element. */
export function newObservationRow(
  targetId: number,
  mode: Pick<ModeRecord, 'modeId' | 'kind'>,
): ObservationRow {
  return {
    targetId,
    modeId: mode.modeId,
    constraintSetId: null,
    wantedSnr: '10',
    snrPer: mode.kind === 'imaging' ? 'image' : 'resolution-element',
    feature: '',
    ownName: '',
    ownRestA: '',
    askedHours: '0',
  }
}
