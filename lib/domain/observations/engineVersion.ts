import { cosmologyEngineVersion } from '@/lib/science/cosmology'
import { skyEngineVersion } from '@/lib/science/sky'

/** The versions of everything a computation rests on: it changes whenever any number can. */
export const engineVersion = `${cosmologyEngineVersion}+sky.${skyEngineVersion}`
