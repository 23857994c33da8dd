import { describe, expect, it } from 'vitest'
import { computeProposal } from '@/lib/domain/observations/computeProposal'
import { groupsVerdict } from '@/lib/domain/observations/groupsVerdict'
import type { Verdict } from '@/lib/domain/observations/types'
import type { ProposalContents, Target } from '@/lib/domain/proposals/types'
import { findPreset, presetCosmology } from '@/lib/science/cosmology'
import { contents, observation, target } from '@/tests/support/contents'

const one = (given: ProposalContents) => {
  const [first] = computeProposal(given).observations
  if (!first) throw new Error('nothing was computed')
  return first
}

describe('the computation of a proposal', () => {
  it('gives the same bytes for the same contents', () => {
    expect(JSON.stringify(computeProposal(contents()))).toBe(JSON.stringify(computeProposal(contents())))
  })

  it('gives each target the distances of the chosen cosmology and of the one beside it', () => {
    const [computed] = computeProposal(contents()).targets
    expect(computed?.luminosityMpc).toBe(presetCosmology('planck-2018').luminosityMpc(0.15834))
    expect(computed?.comparison?.luminosityMpc).toBe(presetCosmology('local-ladder').luminosityMpc(0.15834))
  })

  it('adds the months up to the season', () => {
    const [computed] = computeProposal(contents()).targets
    const months = computed?.visibleHoursByMonth ?? []
    expect(months.map(({ month }) => month)).toEqual(['2027-02', '2027-03'])
    expect(months.reduce((sum, { hours }) => sum + hours, 0)).toBeCloseTo(computed?.visibleHours ?? 0, 9)
    expect(computed?.visibleHoursByNight).toHaveLength(59)
  })

  it('says in words that a redshift does not exist in a bouncing universe', () => {
    const parameters = { ...findPreset('planck-2018').parameters, Om0: 0.3, Ode0: 1.75, Tcmb0: 0, Neff: 0 }
    const bounce = {
      id: 'custom',
      parameters: { ...parameters, name: 'Mine', mNuEv: [] },
      comparisonId: null,
    }
    const given = contents({ cosmology: bounce, targets: [target({ redshift: 3 })] })
    expect(computeProposal(given).targets[0]).toMatchObject({ luminosityMpc: null })
    expect(computeProposal(given).targets[0]?.refusal).toContain('no big bang')
    expect(one(given).checks.find(({ id }) => id === 'redshift-exists')?.verdict).toBe('not-feasible')
  })

  it.each<[string, Partial<ProposalContents>, string, Verdict]>([
    ['no brightness', { targets: [target({ brightness: null })] }, 'brightness-given', 'not-feasible'],
    ['no position', { targets: [target({ raDeg: null, decDeg: null })] }, 'position-given', 'marginal'],
    ['a mode that is gone', { modes: [] }, 'mode-on-offer', 'not-feasible'],
    [
      'the same twice',
      { observations: [observation(), observation({ id: 22, position: 2 })] },
      'not-asked-twice',
      'not-feasible',
    ],
    [
      'evenings outside the season',
      { constraintSets: contents().constraintSets.map((set) => ({ ...set, dateFrom: '2028-01-01' })) },
      'dates-in-season',
      'not-feasible',
    ],
  ])('has a check that says so with %s', (_, over, id, verdict) => {
    const found = one(contents(over)).checks.find((check) => check.id === id)
    expect(found?.verdict).toBe(verdict)
    expect(found?.fix).toBeTruthy()
  })

  it('needs more for a fainter target, and the same whatever the cosmology when it was observed', () => {
    const faint = target({
      brightness: {
        ...(target().brightness as NonNullable<ReturnType<typeof target>['brightness']>),
        value: 21,
      },
    })
    const needed = one(contents({ targets: [faint] })).neededSeconds ?? 0
    expect(needed).toBeGreaterThan(one(contents()).neededSeconds ?? Infinity)
    const other = findPreset('einstein-de-sitter').parameters
    const cosmology = { id: 'custom', parameters: { ...other, mNuEv: [...other.mNuEv] }, comparisonId: null }
    expect(one(contents({ targets: [faint], cosmology })).neededSeconds).toBe(needed)
  })

  it('cites the records it used', () => {
    expect(computeProposal(contents()).recordVersions).toEqual({
      site: 3,
      'telescope aldous': 1,
      'mode spindle-red': 2,
    })
  })
})

describe('the verdict of a proposal', () => {
  const need = (id: number, how: Target['need']) => ({ id, need: how, group: null })
  const got = (targetId: number, verdict: Verdict) => ({
    ...{ id: targetId, observationId: targetId, targetId, verdict },
    ...{ times: 1, askedSeconds: 3600 },
  })
  it.each<[string, ReturnType<typeof need>[], ReturnType<typeof got>[], Verdict | null]>([
    ['nothing asked', [need(1, 'required')], [], null],
    [
      'the worst required',
      [need(1, 'required'), need(2, 'required')],
      [got(1, 'feasible'), got(2, 'marginal')],
      'marginal',
    ],
    [
      'an optional one does not sink it',
      [need(1, 'required'), need(2, 'optional')],
      [got(1, 'feasible'), got(2, 'not-feasible')],
      'feasible',
    ],
    [
      'a backup does not sink it',
      [need(1, 'required'), need(2, 'backup')],
      [got(1, 'marginal'), got(2, 'not-feasible')],
      'marginal',
    ],
    ['only optional ones', [need(1, 'optional')], [got(1, 'not-feasible')], 'not-feasible'],
    [
      'a required one without an observation',
      [need(1, 'required'), need(2, 'required')],
      [got(1, 'feasible')],
      'marginal',
    ],
  ])('%s', (_, targets, computed, verdict) => {
    expect(groupsVerdict({ groups: [], targets, observations: computed }, computed).verdict).toBe(verdict)
  })
})
