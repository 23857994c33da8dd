export interface FooterProps {
  /** The caution that suits the page; without it the full one. */
  caution?: string
}

const fullCaution =
  'What Noctuary computes is a planning estimate; the observatory’s instrument staff have the last word. Pointing near the Sun can destroy instruments and eyesight: the observatory’s Sun-avoidance rule governs.'

/** The caution at the foot of every page. */
export function Footer({ caution = fullCaution }: FooterProps) {
  return (
    <footer className="px-gutter pt-16 pb-12">
      <p className="border-t border-rule pt-5 text-caption text-muted">{caution}</p>
    </footer>
  )
}
