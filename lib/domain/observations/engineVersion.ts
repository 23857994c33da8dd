import { cosmologyEngineVersion } from '@/lib/science/cosmology'
import { exposureEngineVersion } from '@/lib/science/exposure'
import { feasibilityEngineVersion } from '@/lib/science/feasibility'
import { skyEngineVersion } from '@/lib/science/sky'

const checks = feasibilityEngineVersion.split(' ', 1)[0] ?? ''

/** The versions of everything a computation rests on, in 40 characters: it changes whenever any number can. */
export const engineVersion = `${checks}+c${cosmologyEngineVersion}.s${skyEngineVersion}.e${exposureEngineVersion}`
