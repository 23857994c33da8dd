/** The parts of MathJax 4 that are used here; the package ships no types of its own. */
declare module 'mathjax' {
  /** An element of MathJax's own small document. */
  export interface LiteNode {
    kind: string
    attributes?: Record<string, string>
    children?: LiteNode[]
  }
  const MathJax: {
    init(config: object): Promise<void>
    tex2svgPromise(tex: string, options: { display: boolean }): Promise<LiteNode>
  }
  export default MathJax
}
