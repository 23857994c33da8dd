import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import type { FakeResponse } from './httpServer'

export const fontPath = '/work-sans.woff2'

/** Text made safe to stand in HTML, attributes included. */
export function escapeHtml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;')
}

const style = `
@font-face { font-family: 'Work Sans'; src: url('${fontPath}') format('woff2'); font-weight: 100 900; }
:root { color-scheme: light; --paper: #faf8f3; --ink: #171c2b; --quiet: #5a6072; --line: #d9d4c7; --link: #2b4a8b; }
* { box-sizing: border-box; }
body { margin: 0; background: var(--paper); color: var(--ink); font: 16px/1.5 'Work Sans', system-ui, sans-serif; }
main { max-width: 46rem; margin: 0 auto; padding: 2.5rem 1.25rem 4rem; }
h1 { font-size: 1.6rem; font-weight: 600; margin: 0 0 .25rem; }
a { color: var(--link); text-underline-offset: .15em; }
.quiet { color: var(--quiet); margin: 0 0 1.5rem; }
.rows { list-style: none; margin: 0; padding: 0; border-top: 1px solid var(--line); }
.rows > li { border-bottom: 1px solid var(--line); }
dl { display: grid; grid-template-columns: max-content 1fr; gap: .25rem 1.25rem; margin: 0 0 1.5rem; }
dt { color: var(--quiet); } dd { margin: 0; overflow-wrap: anywhere; }
button { font: inherit; color: inherit; background: #fff; border: 1px solid var(--ink); border-radius: 4px; padding: .55rem 1rem; cursor: pointer; }
button.main { background: var(--ink); color: var(--paper); }
:focus-visible { outline: 3px solid var(--link); outline-offset: 2px; }
.notice { border-left: 4px solid #a3341f; padding: .5rem 1rem; margin: 0 0 1.5rem; background: #fff; }
pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; margin: 0 0 1.5rem; }
iframe { width: 100%; height: 24rem; border: 1px solid var(--line); background: #fff; }
`

/** A whole page in the quiet style the fakes share. `extraStyle` is for one page's own parts. */
export function htmlPage(title: string, main: string, extraStyle = ''): FakeResponse {
  return {
    status: 200,
    headers: { 'content-type': 'text/html; charset=utf-8', 'referrer-policy': 'no-referrer' },
    body: `<!doctype html>
<html lang="en-GB">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title>
<link rel="icon" href="data:,">
<style>${style}${extraStyle}</style>
</head>
<body>
<main>
${main}
</main>
</body>
</html>
`,
  }
}

/** The house typeface from the installed package, so the fakes need no network. */
export function fontFile(): FakeResponse {
  const file = createRequire(import.meta.url).resolve(
    '@fontsource-variable/work-sans/files/work-sans-latin-wght-normal.woff2',
  )
  return {
    status: 200,
    headers: { 'content-type': 'font/woff2', 'cache-control': 'max-age=86400' },
    body: readFileSync(file),
  }
}
