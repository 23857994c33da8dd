import { parentPort } from 'node:worker_threads'
import loadHighs from 'highs'

/** Runs in a thread of its own, plain JavaScript so that it starts without a build: a programme in, an answer out. */
const highs = await loadHighs()
parentPort?.on('message', ({ programme, seconds, relativeGap }) => {
  const model = highs.createModel(modelOf(highs, programme))
  try {
    model.options.set({
      output_flag: false,
      time_limit: seconds,
      mip_rel_gap: relativeGap,
      mip_abs_gap: 1e-9,
      random_seed: 1,
    })
    if (programme.start) model.setSolution({ colValue: programme.start })
    model.run()
    parentPort?.postMessage(answerOf(highs, model, programme, seconds))
  } finally {
    model.dispose()
  }
})

function modelOf(highs, programme) {
  return {
    numCols: programme.objective.length,
    numRows: programme.rowLower.length,
    sense: highs.constants.objectiveSense.maximize,
    colCost: programme.objective,
    colLower: programme.lower,
    colUpper: programme.upper,
    rowLower: programme.rowLower,
    rowUpper: programme.rowUpper,
    integrality: programme.isInteger,
    matrix: {
      format: 'csr',
      numRows: programme.rowLower.length,
      numCols: programme.objective.length,
      starts: programme.starts,
      indices: programme.indices,
      values: programme.values,
    },
  }
}

function answerOf(highs, model, programme, seconds) {
  const { optimal, infeasible, unbounded, unboundedOrInfeasible, timeLimit } = highs.constants.modelStatus
  const status = model.getModelStatus()
  if (status === infeasible) return none('infeasible', 'Nothing meets every condition.')
  if (status === unbounded || status === unboundedOrInfeasible)
    return none('unbounded', 'The conditions leave no finite best answer.')
  if (status !== optimal && status !== timeLimit)
    return none('failed', `The solver stopped with status ${status}.`)
  // 2: a point that meets every condition is at hand.
  if (model.info.get('primal_solution_status') !== 2)
    return none('unfinished', `No answer was found in ${Math.round(seconds)} seconds.`)
  const objective = model.getObjectiveValue()
  const isMixed = programme.isInteger.includes(1)
  const bound = isMixed ? model.info.get('mip_dual_bound') : status === optimal ? objective : Infinity
  return {
    status: status === optimal ? 'optimal' : 'unfinished',
    values: Float64Array.from(model.getSolution().colValue),
    objective,
    bound,
    gap: bound === objective ? 0 : Math.abs(bound - objective) / Math.max(1e-10, Math.abs(objective)),
  }
}

function none(status, why) {
  return { status, values: null, why }
}
