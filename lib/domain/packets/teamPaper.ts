import { createElement } from 'react'
import { refuse } from '@/lib/errors'
import { formatFingerprint } from '@/lib/format'
import { assemble } from '@/pdf/assembly/assemble'
import { seasonWords } from '@/pdf/packet/packetData'
import { render } from '@/pdf/render'
import { shapesOf } from '@/pdf/writing/shapesOf'
import { TeamDocument } from '@/pdf/writing/TeamDocument'
import type { SentVersion } from '@/db/queries/versions'
import type { Context } from '../context'
import { storedBytes } from '../papers/storedBytes'

/**
 * Who asks, apart from the packet: the names as they were sent, then the words or the document on the team. It checks
 * no right: the verb that calls it has asked whether the ranking is frozen.
 */
export async function teamPaper(
  ctx: Pick<Context, 'storage'>,
  version: SentVersion,
): Promise<{ bytes: Uint8Array; fileName: string }> {
  const { contents } = version.snapshot
  const label = contents.reviewNumber
  if (!label) throw refuse.integrity('A sent proposal has no number for its review.')
  const paper = contents.papers.find(({ kind }) => kind === 'team-expertise')
  const text = paper ? '' : contents.writings.team.text
  const data = {
    head: {
      left: `${contents.site.name}, call ${contents.call.number}`,
      right: seasonWords(contents.call.seasonFrom, contents.call.seasonTo),
    },
    label,
    title: contents.title,
    people: contents.people.map(({ name, institute, role }) => ({ name, institute, isLead: role === 'pi' })),
    text,
    shapes: await shapesOf({ text, references: [], figures: [] }),
    isFollowed: paper !== undefined,
  }
  const own = await render(() => createElement(TeamDocument, data))
  const { bytes } = await assemble({
    title: `${label}, on the team`,
    parts: [
      { bytes: own, bookmark: 'Who asks', isOwn: true },
      ...(paper ? [{ bytes: await storedBytes(ctx, paper), bookmark: 'On the team', isOwn: false }] : []),
    ],
    footer: {
      left: `With names, for the panel once its ranking is frozen. Version ${version.versionNumber}.`,
      middle: formatFingerprint(version.sha256),
      right: label,
    },
  })
  return { bytes, fileName: `${label}-team.pdf` }
}
