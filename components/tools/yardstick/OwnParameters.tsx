'use client'

import { useId } from 'react'
import { ownFields, omQuestion } from '@/components/cosmology/ownFields'
import { LinkLikeButton } from '@/components/ui/LinkLikeButton'
import { formatNumber, formatSigned } from '@/lib/format'
import type { OwnText } from '@/lib/domain/tools/yardstick/state'
import type { MeasuredUniverse } from '@/lib/domain/tools/yardstick/universes'
import { PlainField } from './PlainField'
import { toneOf } from './toneOf'

export interface OwnParametersProps {
  own: OwnText
  universe: MeasuredUniverse
  onChange: (own: OwnText) => void
  onDone: () => void
}

/** How curved the universe typed is, and how much matter it holds without neutrinos. */
function curvatureWords({ cosmology }: MeasuredUniverse, counts: OwnText['omCounts']): string {
  if (!cosmology) return 'No universe yet: the fields say why.'
  const { Ok0, Ode0, parameters } = cosmology
  const flat =
    Ok0 === 0 ? 'Ωk is exactly 0: flat.' : `Ωk ${formatSigned(Ok0, 4)}: ${Ok0 > 0 ? 'open' : 'closed'}.`
  const dark = parameters.Ode0 === 'flat' ? ` ΩΛ follows as ${formatNumber(Ode0, 5)}.` : ''
  const matter = counts === 'all' ? ` Without neutrinos Ωm is ${formatNumber(parameters.Om0, 5)}.` : ''
  return `${flat}${dark}${matter}`
}

/** Parameters of one's own, each read as it is typed: the curvature and the universe they make stand below. */
export function OwnParameters({ own, universe, onChange, onDone }: OwnParametersProps) {
  const id = useId()
  const { troubles } = universe
  const set = (name: keyof OwnText) => (value: string) => onChange({ ...own, [name]: value })
  return (
    <section
      aria-labelledby={id}
      className="mb-8 rounded-b border border-t-4 border-rule bg-surface p-5 max-sm:p-4"
      style={{ borderTopColor: `var(--${toneOf(universe.place)})` }}
    >
      <div className="flex items-baseline justify-between gap-4">
        <h2 id={id} className="text-section">
          Own parameters
        </h2>
        <LinkLikeButton onClick={onDone}>Done</LinkLikeButton>
      </div>
      <div className="mt-4 grid gap-x-6 gap-y-5 sm:grid-cols-2 lg:grid-cols-4">
        {ownFields.slice(0, 2).map(({ name, label, help, unit }) => (
          <PlainField
            key={name}
            label={label}
            help={unit ? `${help}, ${unit}` : help}
            value={own[name]}
            onChange={set(name)}
            error={troubles[name]}
          />
        ))}
        <fieldset className="m-0 border-0 p-0 sm:col-span-2">
          <legend className="p-0 text-body font-semibold">{omQuestion.label}</legend>
          {omQuestion.options.map(({ value, label, help }) => (
            <label key={value} className="mt-1.5 flex items-center gap-3 max-sm:min-h-11">
              <input
                type="radio"
                name={`${id}-om`}
                className="radio"
                checked={own.omCounts === value}
                onChange={() => onChange({ ...own, omCounts: value })}
              />
              <span>
                {label} <span className="ml-1 text-caption text-muted">{help}</span>
              </span>
            </label>
          ))}
        </fieldset>
        {ownFields.slice(2).map(({ name, label, help, unit }) => (
          <PlainField
            key={name}
            label={label}
            help={unit ? `${help}, ${unit}` : help}
            value={own[name]}
            onChange={set(name)}
            error={troubles[name]}
            optional={name === 'Ode0' || name === 'mNuEv'}
          />
        ))}
        <div className="sm:col-span-2">
          <PlainField
            label="Name"
            help="As it stands in tables and files"
            value={own.name}
            onChange={set('name')}
            error={troubles.name}
            optional
          />
        </div>
      </div>
      <p aria-live="polite" className="mt-5 border-t border-rule pt-3">
        <span className="text-table text-muted">{curvatureWords(universe, own.omCounts)}</span>{' '}
        {universe.cosmology ? universe.sentence : null}
      </p>
    </section>
  )
}
