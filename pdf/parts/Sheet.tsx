import { Page } from '@react-pdf/renderer'
import type { ReactNode } from 'react'
import { fontFamily } from '../fonts'
import { colour, size } from '../theme'

/** An A4 page of the house: margins, type, and room at the foot. */
export function Sheet({ children }: { children: ReactNode }) {
  return (
    <Page
      size="A4"
      style={{
        fontFamily: fontFamily as unknown as string,
        fontSize: size.text,
        color: colour.ink,
        paddingTop: 40,
        paddingHorizontal: size.margin,
        paddingBottom: size.foot,
      }}
    >
      {children}
    </Page>
  )
}
