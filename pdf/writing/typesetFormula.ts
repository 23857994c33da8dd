import MathJax, { type LiteNode } from 'mathjax'
import { clipped, type Window } from './clipped'
import type { FormulaShape } from './formulaShape'
import { identity, matrixOf, moved, pathOf, segmentsOf, times, type Matrix, type Segment } from './outline'

let ready: Promise<void> | null = null

/** Sets MathJax up once in a process: TeX to outlines, without menus, speech, macros from outside or a page. */
function begin(): Promise<void> {
  ready ??= MathJax.init({
    loader: {
      load: [
        'input/tex-base',
        '[tex]/ams',
        '[tex]/boldsymbol',
        '[tex]/cancel',
        '[tex]/upgreek',
        'output/svg',
        'adaptors/liteDOM',
      ],
    },
    tex: { packages: { '[+]': ['ams', 'boldsymbol', 'cancel', 'upgreek'] }, maxMacros: 300, maxBuffer: 4096 },
    // A formula is never broken at the end of a line: it would come in parts.
    svg: { fontCache: 'none', linebreaks: { inline: false } },
    startup: { typeset: false },
  })
  return ready
}

const number = (node: LiteNode, name: string) => Number.parseFloat(node.attributes?.[name] ?? '0') || 0

function windowOf(node: LiteNode): Window | null {
  const [x, y, width, height] = (node.attributes?.viewBox ?? '').split(/[\s,]+/).map(Number)
  return x === undefined || y === undefined || !width || !height ? null : { x, y, width, height }
}

function rectangle(node: LiteNode): Segment[] {
  const [x, y] = [number(node, 'x'), number(node, 'y')]
  const [right, bottom] = [x + number(node, 'width'), y + number(node, 'height')]
  return segmentsOf(`M${x} ${y}L${right} ${y}L${right} ${bottom}L${x} ${bottom}Z`)
}

/** A window, and where it lies in the whole. */
interface Frame {
  window: Window | null
  placed: Matrix
}

/** Every outline below a node, through its transforms. Throws on what cannot be drawn as an outline. */
function outlines(node: LiteNode, frame: Frame, outer: Matrix = identity): Segment[] {
  const { kind, attributes, children = [] } = node
  const own = times(outer, matrixOf(attributes?.transform))
  const drawn = (segments: Segment[]) => {
    const inFrame = moved(segments, own)
    return moved(frame.window ? clipped(inFrame, frame.window) : inFrame, frame.placed)
  }
  if (kind === 'path') return drawn(segmentsOf(attributes?.d ?? ''))
  if (kind === 'rect') return drawn(rectangle(node))
  if (kind === 'g') return children.flatMap((child) => outlines(child, frame, own))
  if (kind === 'svg') {
    const inner = frameOf(node, times(frame.placed, own))
    return children.flatMap((child) => outlines(child, inner))
  }
  throw new Error(`a part that is no outline: ${kind}`)
}

function frameOf(node: LiteNode, outer: Matrix): Frame {
  const window = windowOf(node)
  if (!window) return { window, placed: outer }
  const [sx, sy] = [number(node, 'width') / window.width, number(node, 'height') / window.height]
  const inside: Matrix = [sx, 0, 0, sy, number(node, 'x') - sx * window.x, number(node, 'y') - sy * window.y]
  return { window, placed: times(outer, inside) }
}

const find = (node: LiteNode, kind: string): LiteNode | null =>
  node.kind === kind
    ? node
    : (node.children ?? []).reduce<LiteNode | null>((found, child) => found ?? find(child, kind), null)

/** A formula as one outline; null when it cannot be read, or holds something that is no outline. */
export async function typesetFormula(tex: string, display: boolean): Promise<FormulaShape | null> {
  await begin()
  try {
    const svg = find(await MathJax.tex2svgPromise(tex, { display }), 'svg')
    const view = svg && windowOf(svg)
    if (!svg || !view) return null
    const segments = (svg.children ?? []).flatMap((child) =>
      outlines(child, { window: null, placed: identity }),
    )
    const em = 1000
    return {
      path: pathOf(segments),
      widthEm: view.width / em,
      heightEm: -view.y / em,
      depthEm: (view.y + view.height) / em,
    }
  } catch {
    return null
  }
}
