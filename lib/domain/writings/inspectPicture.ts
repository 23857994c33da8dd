import sharp from 'sharp'
import { refuse } from '@/lib/errors'
import { formatBytes, formatNumber } from '@/lib/format'
import { fileKind } from '../papers/fileKind'
import { maxFigureBytes } from './limits'

export interface Picture {
  bytes: Uint8Array
  contentType: 'image/png' | 'image/jpeg'
  widthPx: number
  heightPx: number
}

const no = (sentence: string) => refuse.field('file', sentence)
const smallestPx = 40
/** More than print can show on a page; larger ones are made smaller. */
const widestPx = 3000
const mostPixels = 80_000_000

/**
 * Looks a picture through and draws it anew: what it is by its bytes, that it can be read, turned as its camera held
 * it. Nothing but the pixels is kept: no place, camera, author, comment or thumbnail.
 */
export async function inspectPicture(bytes: Uint8Array, fileName: string): Promise<Picture> {
  if (bytes.length === 0) throw no(`${fileName} is empty.`)
  if (bytes.length > maxFigureBytes)
    throw no(
      `${fileName} has ${formatBytes(bytes.length)}; at most ${formatBytes(maxFigureBytes)} are taken.`,
    )
  const kind = fileKind(bytes)
  if (kind !== 'png' && kind !== 'jpeg') {
    const instead = typeof kind === 'string' ? 'a PDF' : kind.instead
    throw no(`${fileName} is not a PNG or JPEG picture: by its contents it is ${instead}.`)
  }
  const { data, info } = await redrawn(bytes, kind, fileName)
  if (info.width < smallestPx || info.height < smallestPx)
    throw no(
      `${fileName} has ${formatNumber(info.width)} × ${formatNumber(info.height)} pixels: too few to print.`,
    )
  return {
    bytes: new Uint8Array(data),
    contentType: kind === 'png' ? 'image/png' : 'image/jpeg',
    widthPx: info.width,
    heightPx: info.height,
  }
}

async function redrawn(bytes: Uint8Array, kind: 'png' | 'jpeg', fileName: string) {
  try {
    const picture = sharp(bytes, { limitInputPixels: mostPixels, failOn: 'error', pages: 1 })
      .rotate()
      .toColourspace('srgb')
      .resize({ width: widestPx, height: widestPx, fit: 'inside', withoutEnlargement: true })
    const written = kind === 'png' ? picture.png() : picture.jpeg({ quality: 90 })
    return await written.toBuffer({ resolveWithObject: true })
  } catch {
    throw no(
      `${fileName} cannot be read as a picture: it is damaged, or has too many pixels. Export it anew.`,
    )
  }
}
