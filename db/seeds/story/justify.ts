import { createHash } from 'node:crypto'
import { uploadPaper } from '../../../lib/domain/papers/uploadPaper.ts'
import { saveWriting } from '../../../lib/domain/writings/saveWriting.ts'
import { paperPdf } from './paperPdf.ts'
import type { SeedProposal } from './proposalData.ts'
import type { Teller } from './teller.ts'
import { writtenReferences, writtenTeam, writtenText } from './writtenText.ts'

/** Every third proposal is written here; the others come with a document. */
const isWritten = (seed: SeedProposal) => seed.title.length % 3 === 0

/** Gives a proposal its justification, in one of the two ways, and those written here their words on the team. */
export async function justify(
  lead: Awaited<ReturnType<Teller['as']>>,
  reference: string,
  seed: SeedProposal,
): Promise<void> {
  if (isWritten(seed)) {
    const texts = { justification: writtenText(seed), references: writtenReferences, team: writtenTeam }
    for (const part of ['justification', 'references', 'team'] as const)
      await saveWriting(lead, { reference, part, text: texts[part], version: 0 })
    return
  }
  const bytes = await paperPdf(seed.title)
  await uploadPaper(lead, {
    reference,
    kind: 'justification',
    file: new File([Buffer.from(bytes)], 'justification.pdf', { type: 'application/pdf' }),
    sha256: createHash('sha256').update(bytes).digest('hex'),
    sizeBytes: bytes.byteLength,
  })
}
