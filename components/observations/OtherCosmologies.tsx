import { Fragment } from 'react'
import { TextLink } from '@/components/ui/TextLink'
import { countInWords, formatList } from '@/lib/format'
import type { Verdict } from '@/lib/domain/observations/types'
import { cosmologyPresets } from '@/lib/science/cosmology'

export interface OtherCosmologiesProps {
  /** The address of this report, its query begun. */
  here: string
  own: string
  engineVersion: string
  other: { id: string; name: string; flips: { name: string; from: Verdict; to: Verdict }[] } | null
}

const words = (verdict: Verdict) => verdict.replace('-', ' ')

/** Under which cosmology the checks stand, the way to the others, and what changes there. */
export function OtherCosmologies({ here, own, engineVersion, other }: OtherCosmologiesProps) {
  const presets = cosmologyPresets.filter(
    ({ id, parameters, standing }) => standing === 'current' && parameters.name !== own && id !== other?.id,
  )
  return (
    <>
      <span>
        {other ? (
          <strong className="text-lamp">
            Shown under {other.name}, not under {own}.{' '}
            {other.flips.length === 0
              ? 'No verdict changes.'
              : `${countInWords(other.flips.length, 'verdict changes', 'verdicts change', true)}: ${formatList(
                  other.flips.map(({ name, from, to }) => `${name}, ${words(from)} to ${words(to)}`),
                )}.`}
          </strong>
        ) : (
          `Under ${own}, engine ${engineVersion}. Marginal lies between the two limits.`
        )}
      </span>
      {other ? <TextLink href={here}>Back to {own}</TextLink> : null}
      <details className="relative">
        <summary className="cursor-pointer text-accent underline underline-offset-4">
          Under another cosmology
        </summary>
        <span className="flex flex-wrap gap-x-4 gap-y-1 pt-2">
          {presets.map(({ id, parameters }) => (
            <Fragment key={id}>
              <TextLink href={`${here}&under=${id}`}>{parameters.name}</TextLink>
            </Fragment>
          ))}
        </span>
      </details>
    </>
  )
}
