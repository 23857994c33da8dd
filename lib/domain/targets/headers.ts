import type { TargetRow } from './schema'

/** What a column of a file may be: a cell of a row, or a position in one. */
export type TargetColumn = keyof TargetRow | 'position' | 'system'

const synonyms: Record<TargetColumn, string[]> = {
  geometry: ['shape', 'geometry'],
  name: ['name', 'target', 'object', 'targetname', 'objectname', 'source', 'id'],
  position: ['position', 'coordinates', 'coord', 'coords', 'radec'],
  ra: ['ra', 'raj2000', 'sra', 'radeg', 'rightascension', 'alpha', 'raicrs'],
  dec: ['dec', 'dej2000', 'decj2000', 'sdec', 'decdeg', 'declination', 'delta', 'deicrs', 'decicrs'],
  redshift: ['z', 'redshift', 'zspec', 'zphot', 'zbest'],
  redshiftType: ['ztype', 'redshifttype', 'zkind'],
  redshiftError: ['ez', 'zerr', 'zerror', 'redshifterror'],
  redshiftFrame: ['zframe', 'redshiftframe'],
  magnitude: ['mag', 'magnitude', 'm', 'brightness'],
  magnitudeError: ['emag', 'magerr', 'magerror', 'magnitudeerror'],
  band: ['band', 'filter'],
  system: ['system', 'magsystem', 'magnitudesystem'],
  provenance: ['provenance', 'magprovenance'],
  source: ['magsource', 'reference', 'bibcode', 'ref'],
  need: ['need', 'priority', 'importance'],
  effectiveRadius: ['re', 'reff', 'effectiveradius', 'halflightradius', 'radius', 'reffarcsec'],
  sersicIndex: ['n', 'sersic', 'sersicindex', 'nser'],
  ebv: ['ebv', 'ebminusv', 'reddening', 'galacticebv'],
  magnification: ['mu', 'magnification'],
  magnificationError: ['emu', 'muerr', 'magnificationerror'],
  lineName: ['line', 'linename'],
  lineKind: ['linekind'],
  lineValue: ['linevalue', 'lineflux'],
  lineError: ['lineerror', 'elineflux', 'linefluxerror'],
  lineWidth: ['fwhm', 'linewidth', 'linefwhm'],
  pmRa: ['pmra', 'pmracosdec'],
  pmDec: ['pmdec', 'pmde'],
  epoch: ['epoch', 'refepoch'],
}

const bandHeads = new Set(['u', 'g', 'r', 'i', 'y', 'j', 'h', 'k', 'b', 'v', 'u_ab', 'gmag', 'rmag', 'imag'])

const plain = (head: string) =>
  head
    .replace(/\(.*?\)|\[.*?\]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]/g, '')

export interface KnownHeads {
  /** Column by place in the file. */
  columns: Map<number, TargetColumn>
  /** The band a magnitude column is named after, where it is. */
  band: string | null
  unknown: string[]
}

/** Recognises a file's heads whatever their order, case and units. */
export function readHeads(heads: readonly string[]): KnownHeads {
  const columns = new Map<number, TargetColumn>()
  const unknown: string[] = []
  let band: string | null = null
  heads.forEach((head, index) => {
    const word = plain(head)
    const found = (Object.keys(synonyms) as (keyof typeof synonyms)[]).find((column) =>
      synonyms[column].includes(word),
    )
    const taken = new Set(columns.values())
    if (found && !taken.has(found)) columns.set(index, found)
    else if (!found && bandHeads.has(word) && !taken.has('magnitude')) {
      columns.set(index, 'magnitude')
      band = head.trim().charAt(0)
    } else if (word !== '') unknown.push(head.trim())
  })
  return { columns, band, unknown }
}
