import type { ReactNode } from 'react'
import type { NumberColumnId } from './numberColumns'

const DL = (
  <>
    D<sub>L</sub>
  </>
)
const DM = (
  <>
    D<sub>M</sub>
  </>
)
const DA = (
  <>
    D<sub>A</sub>
  </>
)
const integral = (from: string, to: string) => (
  <>
    ∫<sub>{from}</sub>
    <sup>{to}</sup>
  </>
)

/** The formula of each computed column, as it is printed. */
export const formulas: Record<NumberColumnId, ReactNode> = {
  luminosity: (
    <>
      {DL} = (1 + z) {DM}(z)
    </>
  ),
  scale: <>s = {DA} · π / 648,000</>,
  lookback: (
    <>
      t = H<sub>0</sub>
      <sup>−1</sup> {integral('0', 'z')} dz / ((1 + z) E(z))
    </>
  ),
  modulus: (
    <>
      μ = 5 log<sub>10</sub>({DL} / 10 pc)
    </>
  ),
  angular: (
    <>
      {DA} = {DM}(z) / (1 + z)
    </>
  ),
  comoving: (
    <>
      D<sub>C</sub> = c / H<sub>0</sub> {integral('0', 'z')} dz / E(z)
    </>
  ),
  age: (
    <>
      t = H<sub>0</sub>
      <sup>−1</sup> {integral('z', '∞')} dz / ((1 + z) E(z))
    </>
  ),
}

const subscripts: Partial<Record<NumberColumnId, ReactNode>> = { luminosity: DL, angular: DA }

/** A column's head with its subscript. */
export function columnHead(id: NumberColumnId, head: string): ReactNode {
  if (id === 'comoving')
    return (
      <>
        D<sub>C</sub>
      </>
    )
  return subscripts[id] ?? head
}
