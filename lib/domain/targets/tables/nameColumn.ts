import type { TargetColumn } from '../targetColumn'

/** Names a column goes by in catalogues, in small letters without marks. */
const synonyms: Record<TargetColumn, string[]> = {
  geometry: ['shape', 'geometry'],
  name: [
    'name',
    'target',
    'object',
    'targetname',
    'objectname',
    'targname',
    'designation',
    'mainid',
    'source',
    'id',
  ],
  position: ['position', 'coordinates', 'coord', 'coords', 'radec'],
  ra: ['ra', 'raj2000', 'sra', 'radeg', 'rightascension', 'alpha', 'raicrs'],
  dec: ['dec', 'dej2000', 'decj2000', 'sdec', 'dedeg', 'decdeg', 'declination', 'delta', 'deicrs', 'decicrs'],
  redshift: ['z', 'redshift', 'zspec', 'zphot', 'zbest', 'zhelio'],
  redshiftType: ['ztype', 'redshifttype', 'zkind'],
  redshiftError: ['ez', 'zerr', 'zerror', 'redshifterror', 'rvzerror'],
  redshiftFrame: ['zframe', 'redshiftframe'],
  magnitude: ['mag', 'magnitude', 'm', 'brightness'],
  magnitudeError: ['emag', 'magerr', 'magerror', 'magnitudeerror'],
  band: ['band', 'filter'],
  system: ['system', 'magsystem', 'magnitudesystem'],
  provenance: ['provenance', 'magprovenance'],
  source: ['magsource', 'reference', 'bibcode', 'ref'],
  need: ['need', 'priority', 'importance'],
  group: ['group', 'targetgroup', 'groupname'],
  event: ['event', 'eventclass'],
  trigger: ['trigger', 'triggercriterion'],
  reaction: ['reaction', 'reactiontime'],
  triggers: ['triggers', 'ntriggers'],
  effectiveRadius: ['re', 'reff', 'effectiveradius', 'halflightradius', 'radius', 'reffarcsec'],
  effectiveRadiusError: [
    'ere',
    'reerr',
    'reerror',
    'refferr',
    'effectiveradiuserror',
    'halflightradiuserror',
    'radiuserror',
    'radiuserr',
  ],
  sersicIndex: ['n', 'sersic', 'sersicindex', 'nser'],
  ebv: ['ebv', 'ebminusv', 'reddening', 'galacticebv'],
  magnification: ['mu', 'magnification'],
  magnificationError: ['emu', 'muerr', 'magnificationerror'],
  lineName: ['line', 'linename'],
  lineKind: ['linekind'],
  lineValue: ['linevalue'],
  lineError: ['lineerror'],
  lineFlux: ['lineflux'],
  lineFluxError: ['elineflux', 'linefluxerror'],
  lineLuminosity: ['lineluminosity'],
  lineLuminosityError: ['elineluminosity', 'lineluminosityerror'],
  lineWidth: ['fwhm', 'linewidth', 'linefwhm'],
  spectrum: ['spectrum', 'spectralshape'],
  spectralIndex: ['spectralindex', 'alphanu'],
  spectralIndexError: ['espectralindex', 'spectralindexerror'],
  temperature: ['blackbodytemperature', 'tbb'],
  spectrumTable: ['spectrumtable'],
  pmRa: ['pmra', 'pmracosdec'],
  pmDec: ['pmdec', 'pmde'],
  epoch: ['epoch', 'refepoch'],
}

const byWord = new Map(
  (Object.entries(synonyms) as [TargetColumn, string[]][]).flatMap(([column, words]) =>
    words.map((word) => [word, column] as const),
  ),
)

/** What a column is by its name, whatever its case, its marks and the unit in brackets; null for an unknown one. */
export function nameColumn(name: string): TargetColumn | null {
  const word = name
    .replace(/\(.*?\)|\[.*?\]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]/g, '')
  return byWord.get(word) ?? null
}
