import type { ProposalContents } from '../proposals/types'

/** The facility records a computation rests on: the site, and each mode asked for with its telescope. */
export function recordVersions(
  contents: Pick<ProposalContents, 'site' | 'modes' | 'observations'>,
): Record<string, number> {
  const versions: Record<string, number> = { site: contents.site.recordVersion }
  const asked = new Set(contents.observations.map(({ modeId }) => modeId))
  for (const mode of contents.modes) {
    if (!asked.has(mode.modeId)) continue
    versions[`telescope ${mode.telescope.slug}`] = mode.telescope.recordVersion
    versions[`mode ${mode.slug}`] = mode.recordVersion
  }
  return versions
}
