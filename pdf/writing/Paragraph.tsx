import { Text, View } from '@react-pdf/renderer'
import type { ComponentProps } from 'react'
import type { Inline } from '@/lib/writing/tree'
import { ascentEm } from '../fonts'
import { Words } from '../parts/Words'
import { runsOf } from '../scripts'
import { Formula } from './Formula'
import { atomsOf, piecesOf, type Atom, type Look, type Piece } from './pieces'
import type { Setting } from './setting'

interface ParagraphProps {
  inlines: readonly Inline[]
  setting: Setting
  /** Size of its letters, points. */
  base: number
  /** Width it has, points. */
  room: number
  bold?: boolean
  color?: string
  textAlign?: 'left' | 'right' | 'center'
}

const leading = 1.5
/** From the foot of a line to its baseline, em; more where a formula of the paragraph reaches lower. */
const usualFoot = 0.5
const space = 0.26

const lookOf = ({ bold, italic }: Look) => ({
  fontWeight: bold ? (600 as const) : (400 as const),
  fontStyle: italic ? ('italic' as const) : ('normal' as const),
})

/**
 * A paragraph. Without formulas it is set as text; with them its words and formulas are laid side by side on one
 * baseline, since the renderer has no drawings inside text.
 */
export function Paragraph(props: ParagraphProps) {
  const { inlines, setting, base, bold = false, color, textAlign = 'left' } = props
  const pieces = piecesOf(inlines, setting, { bold, italic: false })
  if (pieces.some(({ kind }) => kind === 'formula')) return <Laid {...props} pieces={pieces} />
  return (
    <Text style={{ fontSize: base, lineHeight: leading, textAlign, ...(color ? { color } : {}) }}>
      {pieces.map((piece, index) =>
        piece.kind === 'text' ? <Run key={index} piece={piece} base={base} /> : '\n',
      )}
    </Text>
  )
}

function Run({ piece, base }: { piece: Extract<Piece, { kind: 'text' }>; base: number }) {
  return (
    <Text style={lookOf(piece)}>
      {runsOf(piece.text.replace(/[ \t\n]+/g, ' ')).map((run, index) =>
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

const sides = { left: 'flex-start', right: 'flex-end', center: 'center' } as const
type ViewStyle = ComponentProps<typeof View>['style']

function Laid({ pieces, base, room, color, textAlign = 'left' }: ParagraphProps & { pieces: Piece[] }) {
  const style: ViewStyle = {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    justifyContent: sides[textAlign],
  }
  const depths = pieces.map((piece) => (piece.kind === 'formula' ? piece.shape.depthEm + 0.15 : 0))
  const foot = Math.max(usualFoot, ...depths)
  return (
    <View style={style}>
      {atomsOf(pieces).map((atom, index) => (
        <Together key={index} atom={atom} base={base} room={room} foot={foot} color={color} />
      ))}
    </View>
  )
}

interface TogetherProps extends Pick<ParagraphProps, 'base' | 'room'> {
  atom: Atom
  foot: number
  color: string | undefined
}

function Together({ atom, base, room, foot, color }: TogetherProps) {
  if (atom.pieces[0]?.kind === 'break') return <View style={{ width: '100%' }} />
  return (
    <View
      style={{ flexDirection: 'row', alignItems: 'flex-end', marginRight: atom.spaced ? space * base : 0 }}
    >
      {atom.pieces.map((piece, index) => {
        if (piece.kind === 'formula')
          return <Formula key={index} shape={piece.shape} base={base} room={room} foot={foot * base} />
        if (piece.kind === 'break') return null
        // A line of text lies as far below its top as its tallest font rises; fonts differ in that.
        const ascent = Math.max(...[...piece.text].map((one) => ascentEm(one.codePointAt(0) ?? 32)))
        return (
          <Words
            key={index}
            base={base}
            style={{
              ...lookOf(piece),
              lineHeight: leading,
              marginBottom: (foot - (leading - ascent)) * base,
              ...(color ? { color } : {}),
            }}
          >
            {piece.text}
          </Words>
        )
      })}
    </View>
  )
}
