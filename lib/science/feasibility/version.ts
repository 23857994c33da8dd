import { cosmologyEngineVersion } from '../cosmology'
import { exposureEngineVersion } from '../exposure'
import { skyEngineVersion } from '../sky'

/** The checks of this folder and every engine they stand on: two reports with the same text agree. */
export const feasibilityEngineVersion = `1.3.0 (cosmology ${cosmologyEngineVersion}, sky ${skyEngineVersion}, exposure ${exposureEngineVersion})`
