import type { MathNode } from 'mathjs'
import { parseText } from './parseText'

/** What a formula is computed from: named quantities of one proposal; null where there is none. */
export type Quantities = Readonly<Record<string, number | null>>

export interface Formula {
  /** Names of the quantities it uses, each once, in order of appearance. */
  names: string[]
  /** Its value for one proposal; null where a quantity is missing, or the value is no finite number. */
  valueOf: (quantities: Quantities) => number | null
}

type Compute = (quantities: Quantities) => number

export const formulaFunctions = {
  min: Math.min,
  max: Math.max,
  abs: Math.abs,
  sqrt: Math.sqrt,
  exp: Math.exp,
  log: Math.log,
} as const

const operators: Readonly<Record<string, (a: number, b: number) => number>> = {
  add: (a, b) => a + b,
  subtract: (a, b) => a - b,
  multiply: (a, b) => a * b,
  divide: (a, b) => a / b,
  pow: (a, b) => a ** b,
}
const manyArguments: ReadonlySet<string> = new Set(['min', 'max'])
export const longestFormula = 300
const mostParts = 80

class NotAllowed extends Error {}

/** A reader of one node: only what is named here is understood, and everything else is refused by its own words. */
function compile(node: MathNode, known: ReadonlySet<string>, used: Set<string>): Compute {
  const inner = (child: MathNode) => compile(child, known, used)
  switch (node.type) {
    case 'ConstantNode': {
      const { value } = node as MathNode & { value: unknown }
      if (typeof value !== 'number' || !Number.isFinite(value))
        throw new NotAllowed(`${String(node)} is no number that can be computed with.`)
      return () => value
    }
    case 'SymbolNode': {
      const { name } = node as MathNode & { name: string }
      if (!known.has(name))
        throw new NotAllowed(`There is no quantity called ${name}. There are: ${[...known].join(', ')}.`)
      used.add(name)
      return (quantities) => quantities[name] ?? Number.NaN
    }
    case 'ParenthesisNode':
      return inner((node as MathNode & { content: MathNode }).content)
    case 'OperatorNode':
      return operation(node as MathNode & Operation, inner)
    case 'FunctionNode':
      return call(node as MathNode & Call, inner)
    default:
      throw new NotAllowed(
        `${String(node).slice(0, 40)} is not understood: a formula has numbers, quantities, + − * / ^, brackets and ${Object.keys(formulaFunctions).join(', ')}.`,
      )
  }
}

interface Operation {
  fn: string
  args: MathNode[]
  implicit: boolean
}

function operation(node: MathNode & Operation, inner: (child: MathNode) => Compute): Compute {
  if (node.implicit)
    throw new NotAllowed(`Write the multiplication out, with *: ${String(node).slice(0, 40)}.`)
  const args = node.args.map(inner)
  const [a, b] = args
  if (a && !b && node.fn === 'unaryMinus') return (quantities) => -a(quantities)
  if (a && !b && node.fn === 'unaryPlus') return a
  const run = Object.hasOwn(operators, node.fn) ? operators[node.fn] : undefined
  if (!a || !b || !run || args.length !== 2)
    throw new NotAllowed(`${String(node).slice(0, 40)} is not understood: operators are + − * / ^.`)
  return (quantities) => run(a(quantities), b(quantities))
}

interface Call {
  fn: MathNode & { name?: string; type: string }
  args: MathNode[]
}

function call(node: MathNode & Call, inner: (child: MathNode) => Compute): Compute {
  const name = node.fn.type === 'SymbolNode' ? (node.fn.name ?? '') : ''
  const isKnown = (word: string): word is keyof typeof formulaFunctions =>
    Object.hasOwn(formulaFunctions, word)
  if (!isKnown(name))
    throw new NotAllowed(
      `There is no function ${name || String(node.fn).slice(0, 40)}. There are: ${Object.keys(formulaFunctions).join(', ')}.`,
    )
  const args = node.args.map(inner)
  if (args.length === 0 || (args.length > 1 && !manyArguments.has(name)))
    throw new NotAllowed(`${name} takes ${manyArguments.has(name) ? 'one value or more' : 'one value'}.`)
  const run: (...values: number[]) => number = formulaFunctions[name]
  return (quantities) => run(...args.map((arg) => arg(quantities)))
}

/**
 * Reads a formula over named quantities into a function, or says in a sentence why it cannot. The text is parsed and
 * never evaluated: each node of the tree is compared with a list of what is allowed, and computed here.
 */
export function readFormula(text: string, names: readonly string[]): Formula | { why: string } {
  if (text.trim() === '') return { why: 'Write a formula.' }
  if (text.length > longestFormula) return { why: `At most ${longestFormula} characters.` }
  const tree = parseText(text)
  if ('why' in tree) return tree
  let parts = 0
  tree.root.traverse(() => (parts += 1))
  if (parts > mostParts) return { why: `At most ${mostParts} parts: numbers, quantities and signs.` }
  const used = new Set<string>()
  try {
    const compute = compile(tree.root, new Set(names), used)
    return {
      names: [...used],
      valueOf: (quantities) => {
        const value = compute(quantities)
        return Number.isFinite(value) ? value : null
      },
    }
  } catch (error) {
    if (error instanceof NotAllowed) return { why: error.message }
    throw error
  }
}
