import type { ReactNode } from 'react'
import { Chrome } from '../Chrome'

export default function Layout({ children }: { children: ReactNode }) {
  return <Chrome area="reviewer">{children}</Chrome>
}
