import { parseText } from '@/lib/writing/parseText'
import { Inlines } from './Inlines'
import type { ReadAs } from './readAs'

export interface ShownFigure {
  label: string
  caption: string
  /** Where the picture is fetched from. */
  href: string
  widthPx: number
  heightPx: number
}

export interface FigurePictureProps {
  figure: ShownFigure
  number: number
  as: ReadAs
}

/** A figure with its number and caption. */
export function FigurePicture({ figure, number, as }: FigurePictureProps) {
  const words = parseText(figure.caption).flatMap((block) => ('inlines' in block ? block.inlines : []))
  return (
    <figure className="m-0 my-4">
      {/* Not the image loader of the framework: these are private, and fetched with the session. */}
      {/* eslint-disable-next-line @next/next/no-img-element */}
      <img
        src={figure.href}
        alt={`Figure ${number}`}
        width={figure.widthPx}
        height={figure.heightPx}
        className="block h-auto max-h-96 w-auto max-w-full"
      />
      <figcaption className="mt-1 text-caption">
        <strong className="font-semibold">Figure {number}.</strong> <Inlines inlines={words} as={as} />
      </figcaption>
    </figure>
  )
}
