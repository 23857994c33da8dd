/** The first stop of the keyboard: past band, head and links to the page itself. */
export function SkipLink() {
  return (
    <a
      href="#main"
      className="skip-link sr-only rounded bg-ink px-4 py-2 font-semibold text-ground focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50"
    >
      Skip to the page
    </a>
  )
}
