import { createHash } from 'node:crypto'
import sharp from 'sharp'
import type { UploadFigureInput } from '@/lib/domain/writings/uploadFigure'

/** A JPEG held sideways by a camera that wrote down its owner. */
export const photograph = (width = 80, height = 50): Promise<Buffer> =>
  sharp({ create: { width, height, channels: 3, background: '#8899aa' } })
    .jpeg()
    .withExif({ IFD0: { Artist: 'Maren Sollvik' } })
    .withMetadata({ orientation: 6 })
    .toBuffer()

/** A picture as the browser sends it. */
export function asUpload(
  reference: string,
  bytes: Uint8Array,
  over: Partial<UploadFigureInput> & { name?: string } = {},
): UploadFigureInput {
  const { name = 'Field map.jpg', ...rest } = over
  return {
    reference,
    figureId: null,
    file: new File([new Uint8Array(bytes)], name),
    sha256: createHash('sha256').update(bytes).digest('hex'),
    sizeBytes: bytes.length,
    ...rest,
  }
}
