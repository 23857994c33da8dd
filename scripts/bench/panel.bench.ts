import { optimalAssignments } from '../../lib/panel/assignment/optimalAssignments'
import { seededUniform } from '../../lib/panel/random'
import { solveInWorker } from '../../lib/services/solver/solveInWorker'
import { sayTime } from './measure'
import { reportText } from './report'

/** One panel solved once, by the clock on the wall: the solver works in a thread of its own. */
async function assign(proposals: number, reviewers: number, seconds: number, areAlike: boolean) {
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
    affinity: (proposal: number, reviewer: number) =>
      areAlike ? 1 : (known[proposal * reviewers + reviewer - 1] ?? 0),
    seconds,
  }
  const start = performance.now()
  const answer = await optimalAssignments(input, solveInWorker)
  const time = sayTime((performance.now() - start) / 1000)
  const gap = ({ value, bound }: { value: number; bound: number }) =>
    `${(100 * (1 - value / bound)).toFixed(2)} %`
  reportText(
    `readers for ${proposals.toLocaleString('en')} proposals among ${reviewers}${areAlike ? ', all alike' : ''}`,
    time,
    'why' in answer
      ? answer.why
      : `gap ${gap(answer.worst)} worst, ${gap(answer.sum)} sum; ${answer.outside.length} loads outside`,
  )
}

for (const areAlike of [true, false]) {
  await assign(300, 60, 15, areAlike)
  await assign(2000, 200, 55, areAlike)
}
