import { bandChoice, magnitudeBands } from '../bands'
import { emptyTargetRow } from '../targetRow'

/** A band as a target has it, 'r AB', from its letter and, where there is one, its system; an unknown one as it is. */
export function bandOf(band: string | null, system: string): string {
  if (!band) return emptyTargetRow.band
  const wanted = system.toLowerCase()
  const whole = magnitudeBands.find((one) => bandChoice(one.band, one.system) === band)
  const found =
    magnitudeBands.find((one) => one.band === band && (!wanted || one.system.toLowerCase() === wanted)) ??
    whole
  return found ? bandChoice(found.band, found.system) : band
}
