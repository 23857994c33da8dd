import { size } from '../theme'
import { Words } from './Words'

/** The title of a section of a page. */
export function Heading({ children }: { children: string }) {
  return (
    <Words base={size.section} style={{ fontWeight: 600, marginTop: 17, marginBottom: 5 }}>
      {children}
    </Words>
  )
}
