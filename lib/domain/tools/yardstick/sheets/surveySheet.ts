import { cosmicVariance, expectedCount, surveyVolumeMpc3 } from '@/lib/science/cosmology'
import { ScienceError } from '@/lib/science/ScienceError'
import type { AskedSurvey } from '../surveyFields'
import type { ReadyUniverse } from '../universes'
import { redshiftColumn } from './redshiftColumn'
import { withDecimals, type Sheet, type SheetCell, type SheetColumn } from './sheet'

export interface Shell {
  zMin: number
  zMax: number
}

/** The shells between redshifts, in growing order; a redshift given twice parts nothing. */
export function shellsOf(redshifts: readonly number[]): Shell[] {
  const edges = [...new Set(redshifts)].sort((a, b) => a - b)
  return edges.slice(1).map((zMax, index) => ({ zMin: edges[index] ?? zMax, zMax }))
}

/** A value, or the sentence of the engine in its place. */
function valueOr<T>(
  words: string,
  make: () => T,
): { value: T } | { absent: NonNullable<SheetCell['absent']> } {
  try {
    return { value: make() }
  } catch (error) {
    if (error instanceof ScienceError) return { absent: { words, sentence: error.message } }
    throw error
  }
}

/** Over the mean count, in percent; null where no galaxies are named, with the reason where it is not known. */
function varianceOf({ zMin, zMax }: Shell, { areaDeg2, stellarMass }: AskedSurvey): SheetCell {
  if (!stellarMass) return { value: null }
  const found = valueOr('not known here', () => cosmicVariance({ areaDeg2, zMin, zMax, stellarMass }))
  return 'value' in found ? { value: 100 * found.value } : { value: null, absent: found.absent }
}

function columnsOf({ place, name }: ReadyUniverse, survey: AskedSurvey): SheetColumn[] {
  const column = (id: string, head: string, unit: string | undefined, what: string, latex: string) => ({
    id: `${id}_${place + 1}`,
    ...{ head, unit, description: `${what} under ${name}`, latex },
    ...{ fileUnit: id === 'volume' ? 'Mpc3' : '', decimals: id === 'volume' ? null : 0, place },
  })
  return [
    column('volume', 'volume', 'Mpc³', 'comoving volume of the shell in the area', 'V'),
    ...(survey.densityMpc3 === null
      ? []
      : [
          column('count', 'count', undefined, 'expected count', 'N'),
          column('poisson', '±', 'counting', 'standard deviation of counting, root N,', '\\sqrt{N}'),
          ...(survey.stellarMass
            ? [
                column(
                  'cosmic',
                  '±',
                  'clustering',
                  'standard deviation of clustering',
                  '\\sigma_\\mathrm{gal} N',
                ),
              ]
            : []),
        ]),
  ]
}

function cellsOf(
  shell: Shell,
  { cosmology }: ReadyUniverse,
  survey: AskedSurvey,
  share: SheetCell,
): SheetCell[] {
  const { areaDeg2, densityMpc3, stellarMass } = survey
  const width = densityMpc3 === null ? 0 : stellarMass ? 3 : 2
  const volume = valueOr('no such volume', () =>
    surveyVolumeMpc3(cosmology, { solidAngleDeg2: areaDeg2, ...shell }),
  )
  if ('absent' in volume)
    return Array.from({ length: width + 1 }, () => ({ value: null, absent: volume.absent }))
  if (densityMpc3 === null) return [{ value: volume.value }]
  const variance = typeof share.value === 'number' ? share.value / 100 : 0
  const { count, poisson, cosmic } = expectedCount(volume.value, densityMpc3, variance)
  const clustering: SheetCell = share.absent ? { value: null, absent: share.absent } : { value: cosmic }
  return [{ value: volume.value }, { value: count }, { value: poisson }, ...(stellarMass ? [clustering] : [])]
}

/** The volume of each shell of a survey under each universe, and what is expected to be counted in it. */
export function surveySheet(
  shells: readonly Shell[],
  universes: readonly ReadyUniverse[],
  survey: AskedSurvey,
): Sheet {
  const edges = redshiftColumn(shells.flatMap(({ zMin, zMax }) => [zMin, zMax]))
  const { stellarMass } = survey
  return withDecimals({
    title: 'Count in a survey',
    columns: [
      {
        ...edges,
        id: 'z_min',
        unit: 'from',
        description: 'redshift of the near edge',
        latex: 'z_\\mathrm{min}',
      },
      {
        ...edges,
        id: 'z_max',
        unit: 'to',
        description: 'redshift of the far edge',
        latex: 'z_\\mathrm{max}',
      },
      ...(stellarMass
        ? [
            {
              id: 'cosmic_variance',
              head: 'clustering',
              unit: '% of the count',
              fileUnit: '%',
              description: `root cosmic variance over the count, galaxies of log m* ${stellarMass}, Moster et al. 2011`,
              latex: '\\sigma_\\mathrm{gal}',
              decimals: 1,
              place: null,
            },
          ]
        : []),
      ...universes.flatMap((universe) => columnsOf(universe, survey)),
    ],
    rows: shells.map((shell, id) => {
      const share = varianceOf(shell, survey)
      return {
        id,
        cells: [
          { value: shell.zMin },
          { value: shell.zMax },
          ...(stellarMass ? [share] : []),
          ...universes.flatMap((universe) => cellsOf(shell, universe, survey, share)),
        ],
      }
    }),
  })
}
