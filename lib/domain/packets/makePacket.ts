import { createHash } from 'node:crypto'
import { createElement } from 'react'
import { formatEngine, formatFingerprint } from '@/lib/format'
import { assemble, type Part } from '@/pdf/assembly/assemble'
import { packetData } from '@/pdf/packet/packetData'
import { PacketDocument } from '@/pdf/packet/PacketDocument'
import type { PacketData } from '@/pdf/packet/packetTypes'
import { render } from '@/pdf/render'
import { renderWritten } from '@/pdf/writing/renderWritten'
import type { Snapshot } from '../submission/snapshot'
import { needOf } from '../observations/needOf'
import { wishLines } from '../wishes/wishLines'
import { anonymise } from './anonymise'
import { packetRules } from './packetRules'

export type PacketVariant = 'anonymised' | 'full'

/** Raised when the drawing changes, so that kept packets are made anew. */
const layout = 2

export interface PacketInput {
  snapshot: Snapshot
  variant: PacketVariant
  /** Null for a draft that was not sent. */
  versionNumber: number | null
  /** SHA-256 of the justification as a document; null when there is none. */
  paperSha256: string | null
}

function labelOf({ snapshot, variant }: PacketInput): string {
  if (variant === 'full') return snapshot.contents.reference
  return snapshot.contents.reviewNumber ?? 'Draft'
}

function contentOf(input: PacketInput) {
  const { contents } = input.snapshot
  const people =
    input.variant === 'full' ? contents.people.map(({ name, institute }) => ({ name, institute })) : []
  const proposal = anonymise(input.snapshot)
  const { targets, groups } = proposal
  const required = targets.filter((target) => needOf(target, groups) === 'required').length
  return packetData(proposal, {
    ...{ label: labelOf(input), people, required },
    ...{ rules: packetRules(proposal), wishes: wishLines(proposal) },
  })
}

/** Hash of everything that goes into a packet: the same in gives the same packet, and its fingerprint. */
export function packetHash(input: PacketInput): string {
  const { variant, versionNumber, paperSha256, snapshot } = input
  const all = {
    layout,
    variant,
    versionNumber,
    paperSha256,
    engine: snapshot.engineVersion,
    content: contentOf(input),
  }
  return createHash('sha256').update(JSON.stringify(all)).digest('hex')
}

function audience({ variant, versionNumber }: PacketInput): string {
  if (versionNumber === null) return 'Preview of a draft, not sent'
  return variant === 'full' ? 'With names, not for the panel' : 'Without names, for the panel'
}

/** What the pages of others are made of: the document, or the pictures of a text written here. */
export interface PacketParts {
  paper: Uint8Array | null
  /** Bytes of figures by their fingerprint. */
  pictures: ReadonlyMap<string, Uint8Array>
}

async function justification(
  { written, observatory, label }: PacketData,
  { paper, pictures }: PacketParts,
): Promise<Part[]> {
  const bookmark = 'Justification'
  if (paper) return [{ bytes: paper, bookmark, isOwn: false }]
  if (!written) return []
  const bytes = await renderWritten({
    head: { left: observatory, right: label },
    written,
    pictures,
    title: bookmark,
  })
  return [{ bytes, bookmark, isOwn: true }]
}

/** Draws the packet: our pages, then the justification, one footer through all of them. */
export async function makePacket(
  input: PacketInput,
  parts: PacketParts,
): Promise<{ bytes: Uint8Array; pages: number }> {
  const data = contentOf(input)
  const engine = `engine ${formatEngine(input.snapshot.engineVersion)}`
  const made = input.versionNumber === null ? engine : `version ${input.versionNumber}, ${engine}`
  const left = `${audience(input)}. ${made.charAt(0).toUpperCase()}${made.slice(1)}.`
  return assemble({
    title: input.variant === 'full' ? `${data.label}, ${data.title}` : data.label,
    parts: [
      {
        bytes: await render(() => createElement(PacketDocument, { data })),
        bookmark: 'The request',
        isOwn: true,
      },
      ...(await justification(data, parts)),
    ],
    footer: { left, middle: formatFingerprint(packetHash(input)), right: data.label },
  })
}
