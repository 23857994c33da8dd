/** What the index of a power law is: α in f_ν ∝ ν^α, set as formulas are. */
export function PowerLawWords() {
  return (
    <>
      α in f<sub>ν</sub> ∝ ν<sup>α</sup>
    </>
  )
}
