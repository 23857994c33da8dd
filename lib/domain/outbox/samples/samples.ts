import { accountSamples } from './accountSamples'
import { feeSamples } from './feeSamples'
import type { LetterSample } from './letterSample'
import { paperSamples } from './paperSamples'
import { panelSamples } from './panelSamples'
import { proposalSamples } from './proposalSamples'

/** Every letter that can be tried, in the order of a proposal's life. */
export const letterSamples: readonly LetterSample[] = [
  ...accountSamples,
  ...proposalSamples,
  ...feeSamples,
  ...paperSamples,
  ...panelSamples,
]
