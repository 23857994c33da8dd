import { themes } from '@/components/layout/themes'

const words = { day: 'paper', dome: 'for a dark room', red: 'beside the telescope: reds only' } as const
const swatches = [
  'ground',
  'surface',
  'ink',
  'muted',
  'accent',
  'lamp',
  'feasible',
  'marginal',
  'not-feasible',
] as const
const fills: Record<(typeof swatches)[number], string> = {
  ground: 'bg-ground',
  surface: 'bg-surface',
  ink: 'bg-ink',
  muted: 'bg-muted',
  accent: 'bg-accent',
  lamp: 'bg-lamp',
  feasible: 'bg-feasible',
  marginal: 'bg-marginal',
  'not-feasible': 'bg-not-feasible',
}

/** The three lights and their colours, all at once. */
export function ThemesExplained() {
  return (
    <div className="grid gap-4 md:grid-cols-3">
      {themes.map((theme) => (
        <div
          key={theme.id}
          data-theme={theme.id}
          className="rounded border border-edge bg-ground p-4 text-ink"
        >
          <p className="m-0 flex items-baseline justify-between gap-2">
            <strong className="font-semibold">{theme.name}</strong>
            <span className="text-caption text-muted">{words[theme.id]}</span>
          </p>
          <ul className="plain-list mt-3 flex flex-col gap-1.5">
            {swatches.map((name) => (
              <li key={name} className="flex items-center gap-3 text-caption">
                <span aria-hidden="true" className={`h-4 w-8 border border-edge ${fills[name]}`} />
                {name.replace('-', ' ')}
              </li>
            ))}
          </ul>
        </div>
      ))}
    </div>
  )
}
