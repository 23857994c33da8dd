import type { Context } from '../context'
import { storedBytes } from '../papers/storedBytes'
import type { Figure } from '../proposals/writingTypes'
import type { PacketParts } from './makePacket'

interface Stored {
  objectKey: string
  sha256: string
}

/** The bytes a packet is made of beside what is drawn: the document, or where there is none the figures. */
export async function packetParts(
  ctx: Pick<Context, 'storage'>,
  paper: Stored | null,
  figures: readonly Pick<Figure, 'objectKey' | 'sha256'>[],
): Promise<PacketParts> {
  if (paper) return { paper: await storedBytes(ctx, paper), pictures: new Map() }
  const pictures = new Map<string, Uint8Array>()
  for (const figure of figures) pictures.set(figure.sha256, await storedBytes(ctx, figure))
  return { paper: null, pictures }
}
