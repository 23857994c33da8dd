import { describe, expect, it } from 'vitest'
import { cosmologyOf } from '@/lib/domain/observations/cosmologyOf'
import type { ObservationInput } from '@/lib/domain/observations/computeObservation'
import { computeProposal } from '@/lib/domain/observations/computeProposal'
import { hoursHangOn } from '@/lib/domain/observations/hoursUnder'
import { whatWouldMove } from '@/lib/domain/observations/whatWouldMove'
import type { Observation, ProposalContents, Target } from '@/lib/domain/proposals/types'
import { presetCosmology } from '@/lib/science/cosmology'
import { contents, observation, slitMode, target } from '@/tests/support/contents'

const bright = {
  value: 19,
  error: 0.2,
  system: 'AB',
  band: 'V',
  provenance: 'predicted',
  source: '',
} as const

function inputOf(
  change: { target?: Partial<Target>; observation?: Partial<Observation> } = {},
  more: Partial<ProposalContents> = {},
): ObservationInput {
  const one = target({ brightness: bright, redshiftError: 0.002, ...change.target })
  const asked = observation({ wantedSnr: 20, askedSeconds: 7200, ...change.observation })
  const whole = contents({ targets: [one], observations: [asked], ...more })
  return {
    contents: whole,
    target: one,
    observation: asked,
    mode: whole.modes.find(({ modeId }) => modeId === asked.modeId),
    cosmology: cosmologyOf(whole.cosmology.parameters),
  }
}
const computedOf = ({ contents: whole }: ObservationInput) => {
  const [computed] = computeProposal(whole).observations
  if (!computed) throw new Error('nothing was computed')
  return computed
}

// Seen to fail with the magnitude moved the wrong way, and with the draws seeded by the clock.
describe('what the hours hang on', () => {
  it('is what the proposal needs, as asked', () => {
    const input = inputOf()
    expect(Math.ceil(hoursHangOn(input).own.seconds ?? 0)).toBe(computedOf(input).neededSeconds)
  })

  it('tries every current cosmology where the brightness was predicted, none where it was observed', () => {
    const names = hoursHangOn(inputOf()).cosmologies.map(({ name }) => name)
    expect(names).toContain('Planck 2018')
    expect(names).not.toContain('Einstein–de Sitter')
    expect(names.length).toBeGreaterThan(3)
    const observed = inputOf({ target: { brightness: { ...bright, provenance: 'observed' } } })
    expect(hoursHangOn(observed).cosmologies).toEqual([])
  })

  it('spans the error of a spectral index where the magnitude is carried far', () => {
    const spectrum = { kind: 'power-law', index: -1, indexError: 0.5 } as const
    const names = (over: Partial<Target>) =>
      hoursHangOn(inputOf({ target: { brightness: bright, ...over } })).errors.map(({ name }) => name)
    expect(names({ spectrum })).toContain('α = −1.0 ± 0.5')
    expect(names({ spectrum: { ...spectrum, indexError: null } })).not.toContain('α = −1.0 ± 0.5')
    const span = hoursHangOn(inputOf({ target: { spectrum } })).errors.find(({ name }) =>
      name.startsWith('α'),
    )
    // From V to the feature at 7604 A, half a unit of the index is 0.18 mag.
    expect((span?.high ?? 0) / (span?.low ?? 1)).toBeGreaterThan(1.3)
  })

  // Seen to fail with the index left out of the draws.
  it('draws the spectral index with the other errors, and changes none of their draws', () => {
    const last = (indexError: number | null) =>
      hoursHangOn(
        inputOf({
          target: {
            brightness: { ...bright, error: 0.05 },
            redshiftError: 0.0001,
            spectrum: { kind: 'power-law', index: -1, indexError },
          },
        }),
      ).errors.at(-1)
    const [none, next, wide] = [last(null), last(1e-9), last(0.5)]
    expect([none?.name, next?.name]).toEqual(['both together, 68 of 100', 'all together, 68 of 100'])
    expect(next?.low).toBeCloseTo(none?.low ?? 0, 3)
    expect(next?.high).toBeCloseTo(none?.high ?? 0, 3)
    const ratio = (span: typeof none) => (span?.high ?? 0) / (span?.low ?? 1)
    expect(ratio(wide)).toBeGreaterThan(1.1 * ratio(none))
  })

  it('needs less time in a smaller universe, by the power of distance it states', () => {
    const input = inputOf()
    const { own, cosmologies } = hoursHangOn(input)
    const ladder = cosmologies.find(({ name }) => name.startsWith('Local ladder'))
    const ratio =
      presetCosmology('local-ladder').luminosityMpc(0.15834) / input.cosmology.luminosityMpc(0.15834)
    expect(ratio).toBeLessThan(1)
    expect(ladder?.seconds).toBeLessThan(own.seconds ?? 0)
    // Overheads do not shrink, so the fourth power is the most it can be.
    expect(ladder?.seconds).toBeGreaterThan((own.seconds ?? 0) * ratio ** 4)
  })

  it('spans the errors of the target, together no wider than their sum and never beside the middle', () => {
    const { own, errors } = hoursHangOn(inputOf())
    expect(errors.map(({ name }) => name)).toEqual([
      'redshift ± 0.002',
      'magnitude ± 0.20',
      'both together, 68 of 100',
    ])
    for (const { low, high } of errors) {
      expect(low).toBeLessThanOrEqual(own.seconds ?? 0)
      expect(high).toBeGreaterThanOrEqual(own.seconds ?? Infinity)
    }
    const [, magnitude, both] = errors
    expect(both?.high).toBeLessThan(1.3 * (magnitude?.high ?? 0))
    expect(both?.high).toBeGreaterThan(0.8 * (magnitude?.high ?? 0))
  })

  it('says the same whenever it is asked', () => {
    expect(hoursHangOn(inputOf())).toEqual(hoursHangOn(inputOf()))
  })

  it('has no span for what states no error, and none past the edge of the mode', () => {
    const exact = inputOf({ target: { redshiftError: null, brightness: { ...bright, error: null } } })
    expect(hoursHangOn(exact).errors).toEqual([])
    const vague = inputOf({ target: { redshiftError: 0.9 } })
    expect(hoursHangOn(vague).errors.some(({ name }) => name.startsWith('redshift'))).toBe(false)
  })
})

describe('a line and a lens', () => {
  const line = { name: 'Hα', kind: 'luminosity', value: 2e40, error: 4e39, widthKmS: 300 } as const
  const lensed = { line, magnification: 3, magnificationError: 0.5, redshiftError: null }

  it('counts the line where the observation asks for it, and the continuum elsewhere', () => {
    const ofLine = hoursHangOn(inputOf({ target: lensed }))
    const brighter = hoursHangOn(inputOf({ target: { ...lensed, line: { ...line, value: 4e40 } } }))
    expect(brighter.own.seconds).toBeLessThan(ofLine.own.seconds ?? 0)
    const elsewhere = (value: number) =>
      hoursHangOn(
        inputOf({
          target: { ...lensed, line: { ...line, value } },
          observation: { feature: 'Hβ', featureRestA: 4862.68 },
        }),
      ).own.seconds
    expect(elsewhere(4e40)).toBe(elsewhere(2e40))
  })

  it('spans the error of the line and of the magnification', () => {
    const { own, errors, cosmologies } = hoursHangOn(inputOf({ target: lensed }))
    expect(errors.map(({ name }) => name)).toEqual([
      'Hα ± 20\u00a0%',
      'magnification 3.0 ± 0.5',
      'both together, 68 of 100',
    ])
    for (const { low, high } of errors) {
      expect(low).toBeLessThan(own.seconds ?? 0)
      expect(high).toBeGreaterThan(own.seconds ?? Infinity)
    }
    expect(cosmologies.length).toBeGreaterThan(3)
  })

  it('leaves what was observed to itself: no lens, no dust, no cosmology', () => {
    const observed = { brightness: { ...bright, provenance: 'observed', error: null } } as const
    const plain = hoursHangOn(inputOf({ target: observed }))
    const lensedToo = hoursHangOn(inputOf({ target: { ...observed, magnification: 9, galacticEbv: 0.5 } }))
    expect(lensedToo.own).toEqual(plain.own)
    const dimmed = hoursHangOn(inputOf({ target: { galacticEbv: 0.3 } }))
    expect(dimmed.own.seconds).toBeGreaterThan(hoursHangOn(inputOf()).own.seconds ?? Infinity)
  })
})

// Seen to fail with the size left out of the draws, with its error moved the wrong way, and with flips not counted.
describe('a size with its error', () => {
  const wide = { geometry: 'sersic', effectiveRadiusArcsec: 1.5, sersicIndex: 1 } as const
  const image: Partial<ProposalContents> = {
    modes: [
      {
        ...slitMode,
        kind: 'imaging',
        band: 'r',
        dispersionAPerPixel: null,
        slitWidthArcsec: null,
        resolvingPower: null,
        readNoiseE: 0,
        darkEPerS: 0,
        systematicFloor: 0,
        maxSubExposureS: 30,
      },
    ],
  }
  const spanIn = (over: Partial<Target>, more = image) => {
    const light = { ...bright, value: 23.5, error: null, band: 'r', provenance: 'observed' } as const
    const input = inputOf(
      {
        target: { brightness: light, redshiftError: null, ...over },
        observation: { feature: null, featureRestA: null, snrPer: 'image', wantedSnr: 30 },
      },
      more,
    )
    return { input, ...hoursHangOn(input) }
  }

  it('has a span with the power of the size that the time goes with', () => {
    const { own, errors } = spanIn({ ...wide, effectiveRadiusErrorArcsec: 0.3 })
    expect(errors.map(({ name }) => name)).toEqual(['size ± 0.30″'])
    const [span] = errors
    expect(span?.low).toBeLessThan(own.seconds ?? 0)
    expect(span?.high).toBeGreaterThan(own.seconds ?? Infinity)
    // Of a source under the sky the noise is of the area it covers: the square for one that is wide beside the image.
    expect(span?.exponentOfSize).toBeGreaterThan(1)
    expect(span?.exponentOfSize).toBeLessThan(2)
    const huge = spanIn({ ...wide, effectiveRadiusArcsec: 40, effectiveRadiusErrorArcsec: 4 })
    expect(huge.errors[0]?.exponentOfSize).toBeCloseTo(2, 1)
    const tiny = spanIn({ ...wide, effectiveRadiusArcsec: 0.05, effectiveRadiusErrorArcsec: 0.03 })
    expect(tiny.errors[0]?.exponentOfSize).toBeCloseTo(0, 1)
  })

  it('needs less of what is uniformly bright and larger: the inverse of its area', () => {
    const { errors } = spanIn({
      geometry: 'uniform',
      effectiveRadiusArcsec: 3,
      effectiveRadiusErrorArcsec: 0.3,
    })
    expect(errors[0]?.exponentOfSize).toBeCloseTo(-2, 1)
  })

  it('is drawn together with the other errors, and changes none of their draws', () => {
    const light = {
      brightness: { ...bright, value: 23.5, error: 0.2, band: 'r', provenance: 'observed' },
    } as const
    const both = spanIn({ ...wide, ...light, effectiveRadiusErrorArcsec: 0.3 }).errors
    expect(both.map(({ name }) => name)).toEqual([
      'magnitude ± 0.20',
      'size ± 0.30″',
      'both together, 68 of 100',
    ])
    const width = (span: (typeof both)[number] | undefined) => (span?.high ?? 0) - (span?.low ?? 0)
    expect(width(both[2])).toBeGreaterThan(width(both[0]))
    expect(width(both[2])).toBeLessThan(width(both[0]) + width(both[1]))
    const all = spanIn({ ...wide, ...light, redshiftError: 0.002, effectiveRadiusErrorArcsec: 0.3 }).errors
    expect(all.at(-1)?.name).toBe('all together, 68 of 100')
    const without = { ...wide, ...light, redshiftError: 0.002 }
    const none = spanIn({ ...without, effectiveRadiusErrorArcsec: null }).errors.at(-1)
    const next = spanIn({ ...without, effectiveRadiusErrorArcsec: 1e-9 }).errors.at(-1)
    expect(next?.high).toBeCloseTo(none?.high ?? 0, 3)
    expect(spanIn({ ...wide, effectiveRadiusErrorArcsec: 0.3 })).toEqual(
      spanIn({ ...wide, effectiveRadiusErrorArcsec: 0.3 }),
    )
  })

  it('counts the verdicts that flip, at the ends and in the draws', () => {
    const { input, own, errors } = spanIn({ ...wide, effectiveRadiusErrorArcsec: 0.3 })
    expect(errors[0]?.tried).toBe(2)
    const asked = { ...input.observation, askedSeconds: Math.ceil(1.02 * (own.seconds ?? 0)) }
    const tight = hoursHangOn({
      ...input,
      observation: asked,
      target: { ...input.target, redshiftError: 0.001 },
    })
    expect(tight.own.verdict).not.toBe('not-feasible')
    expect(tight.errors.find(({ name }) => name.startsWith('size'))?.flips).toBeGreaterThan(0)
    const drawn = tight.errors.at(-1)
    expect(drawn).toMatchObject({ name: 'both together, 68 of 100', tried: 100 })
    expect(drawn?.flips).toBeGreaterThan(20)
    expect(drawn?.flips).toBeLessThan(100)
  })

  it('has no span for a point, and none for what was frozen before sizes had errors', () => {
    expect(spanIn({ ...wide, geometry: 'point', effectiveRadiusErrorArcsec: 0.3 }).errors).toEqual([])
    expect(spanIn({ ...wide, effectiveRadiusErrorArcsec: undefined as never }).errors).toEqual([])
  })

  it('never shrinks a source to nothing', () => {
    const { errors } = spanIn({ ...wide, effectiveRadiusArcsec: 0.2, effectiveRadiusErrorArcsec: 0.2 })
    expect(errors[0]?.low).toBeGreaterThan(0)
    expect(Number.isFinite(errors[0]?.exponentOfSize)).toBe(true)
  })
})

describe('what would have to move', () => {
  const moves = (input: ObservationInput) => whatWouldMove(input, computedOf(input))

  it('asks for the hours that lack, or a lower signal', () => {
    const input = inputOf({ observation: { askedSeconds: 1800 } })
    const needed = computedOf(input).neededSeconds ?? 0
    expect(needed).toBeGreaterThan(1800)
    const found = moves(input)
    expect(found[0]).toMatch(/^Ask for \d+\.\d\u00a0h, \d+\.\d\u00a0h more\.$/)
    expect(found[1]).toMatch(/^Or be content with S\/N \d+\.\d\.$/)
  })

  it('names the optional target whose hours would cover it, and no required one', () => {
    const spare = (need: Target['need']) => {
      const short = inputOf({ observation: { askedSeconds: 1800 } })
      const other = target({ id: 99, name: 'Spare', need })
      const own = observation({ id: 98, targetId: 99, askedSeconds: 36_000, position: 2 })
      const whole = contents({ targets: [short.target, other], observations: [short.observation, own] })
      return whatWouldMove({ ...short, contents: whole }, computedOf(short)).join(' ')
    }
    expect(spare('optional')).toContain('Leave out Spare, optional')
    expect(spare('required')).not.toContain('Spare')
  })

  it('offers another mode of the kind that is quicker', () => {
    const input = inputOf()
    const [mode] = input.contents.modes
    if (!mode) throw new Error('no mode')
    const large = { ...mode.telescope, collectingAreaM2: 50 }
    const better = { ...mode, modeId: 77, name: 'BEACON, 1.0″ slit', telescope: large }
    const found = whatWouldMove(
      { ...input, contents: { ...input.contents, modes: [mode, better] } },
      computedOf(input),
    )
    expect(found.join(' ')).toMatch(/Another mode: BEACON, 1\.0″ slit takes \d+\.\d/)
  })

  it('has nothing to say where nothing helps', () => {
    const dark = contents().constraintSets.map((set) => ({ ...set, moon: 'dark' as const }))
    expect(moves(inputOf({}, { constraintSets: dark }))).toEqual([])
  })
})
