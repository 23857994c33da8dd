import type { NightBlock } from '../calls/nightBlock'
import type { NightsWritten } from './writeNights'

const hours = (blocks: readonly NightBlock[], useFor: NightBlock['useFor']) =>
  Math.round(blocks.reduce((sum, block) => sum + (block.useFor === useFor ? block.darkSeconds : 0), 0) / 36) /
  100

const summed = (blocks: readonly NightBlock[]) => ({
  scienceHours: hours(blocks, 'science'),
  engineeringHours: hours(blocks, 'engineering'),
  promisedHours: hours(blocks, 'promised'),
})

/** What the logbook keeps of nights that were set: their hours before and after. */
export const nightsLogged = ({ before, after }: NightsWritten) => ({
  before: summed(before),
  after: summed(after),
})
