import { Text } from '@react-pdf/renderer'
import type { ComponentProps } from 'react'
import { runsOf } from '../scripts'

type Style = Exclude<NonNullable<ComponentProps<typeof Text>['style']>, readonly unknown[]>

interface WordsProps {
  children: string
  style?: Style
  /** Size of the letters around a raised or lowered figure. */
  base: number
}

/** Text as people typed it, with small figures set and unknown characters shown as such. */
export function Words({ children, style, base }: WordsProps) {
  return (
    <Text style={{ fontSize: base, ...style }}>
      {runsOf(children).map((run, index) =>
        run.shift ? (
          <Text key={index} style={{ fontSize: base * 0.72, verticalAlign: run.shift }}>
            {run.text}
          </Text>
        ) : (
          run.text
        ),
      )}
    </Text>
  )
}
