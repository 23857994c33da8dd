import type { PlanTerms } from '../decisions/planTerms'
import type { WantedLine } from '../decisions/wantedLines'

interface Ranked {
  order: readonly number[]
  above: ReadonlySet<number>
  setAside: ReadonlySet<number>
  choices: PlanTerms['choices']
}

/** Whether a line is a visit's: what only fills time that others leave is observed in the queue. */
export const isVisit = (line: WantedLine, choices: PlanTerms['choices']): boolean =>
  line.visit !== null && choices.get(line.proposalId)?.choice !== 'filler'

/** Visits in their turns: those of proposals that must be given time, then by rank, as far down as the line. */
export function visitLines(wanted: readonly WantedLine[], ranked: Ranked): WantedLine[] {
  const { order, above, setAside, choices } = ranked
  const choiceOf = (id: number) => choices.get(id)?.choice
  const turn = ({ proposalId }: WantedLine) =>
    order.indexOf(proposalId) - (choiceOf(proposalId) === 'must' ? order.length : 0)
  return wanted
    .filter((line) => {
      const { proposalId } = line
      const isIn = choiceOf(proposalId) === 'must' || (above.has(proposalId) && !choiceOf(proposalId))
      return isVisit(line, choices) && isIn && line.possible && !setAside.has(proposalId)
    })
    .sort((a, b) => turn(a) - turn(b))
}
