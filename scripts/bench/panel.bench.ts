import { optimalAssignments } from '../../lib/panel/assignment/optimalAssignments'
import { seededUniform } from '../../lib/panel/random'
import { solveInWorker } from '../../lib/services/solver/solveInWorker'
import { sayTime } from './measure'
import { reportText } from './report'

/** One panel solved once, by the clock on the wall: the solver works in a thread of its own. */
async function assign(
  proposals: number,
  reviewers: number,
  seconds: number,
  know: 'alike' | 'at random' | 'few fields each',
) {
  const random = seededUniform(proposals)
  const ids = Array.from({ length: reviewers }, (_, i) => i + 1)
  const known = Array.from({ length: proposals * reviewers }, () => Math.round(random() * 100) / 100)
  const input = {
    proposals: Array.from({ length: proposals }, (_, i) => ({
      id: i,
      pages: 4 + Math.floor(random() * 8),
      barred: new Set(ids.filter(() => random() < 0.1)),
    })),
    reviewers: ids,
    standing: [],
    each: 3,
    affinity: (proposal: number, reviewer: number) => {
      if (know === 'alike') return 1
      const chance = known[proposal * reviewers + reviewer - 1] ?? 0
      // Eleven categories, of which each reviewer knows three: most pairs have nothing to do with each other.
      const steps = (proposal - reviewer * 7 + reviewers * 11) % 11
      return know === 'at random' ? chance : 1 - (1 - Math.max(0, 3 - steps) / 4) * (1 - chance ** 6)
    },
    seconds,
  }
  const start = performance.now()
  const answer = await optimalAssignments(input, solveInWorker)
  const time = sayTime((performance.now() - start) / 1000)
  const gap = ({ value, bound }: { value: number; bound: number }) =>
    `${(100 * (1 - value / bound)).toFixed(2)} %`
  reportText(
    `readers for ${proposals.toLocaleString('en')} proposals among ${reviewers}${know === 'at random' ? '' : `, ${know}`}`,
    time,
    'why' in answer
      ? answer.why
      : `gap ${gap(answer.worst)} worst, ${gap(answer.sum)} sum; ${answer.outside.length} loads outside`,
  )
}

for (const know of ['alike', 'at random', 'few fields each'] as const) {
  await assign(300, 60, 20, know)
  await assign(2000, 200, 55, know)
}
