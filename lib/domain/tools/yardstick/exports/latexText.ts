const marks: Record<string, string> = {
  '\\': '\\textbackslash{}',
  '{': '\\{',
  '}': '\\}',
  $: '\\$',
  '&': '\\&',
  '#': '\\#',
  '%': '\\%',
  _: '\\_',
  '^': '\\textasciicircum{}',
  '~': '\\textasciitilde{}',
  '–': '--',
  '−': '$-$',
  '±': '$\\pm$',
  '″': '$^{\\prime\\prime}$',
  '’': "'",
  '“': '``',
  '”': "''",
  '\u00a0': '~',
  '₀': '$_0$',
  ₐ: '$_a$',
  Ω: '$\\Omega$',
  Λ: '$\\Lambda$',
}

/** Words as LaTeX takes them: every character that would be a command is escaped. */
export function latexText(text: string): string {
  return [...text].map((character) => marks[character] ?? character).join('')
}

/** A unit of the files as LaTeX: `km / (Mpc s)` becomes `km\,Mpc$^{-1}$\,s$^{-1}$`. */
export function latexUnit(fileUnit: string): string {
  const [over = '', under = ''] = fileUnit.split(' / ')
  const power = (sign: '' | '-') => (word: string) => {
    const [, name = word, digits = ''] = /^([A-Za-z%]+)(\d*)$/.exec(word) ?? []
    const raised = sign + digits === '-' ? '-1' : sign + digits
    return `${latexText(name)}${raised ? `$^{${raised}}$` : ''}`
  }
  const words = (text: string) => text.replace(/[()]/g, '').split(' ').filter(Boolean)
  return [...words(over).map(power('')), ...words(under).map(power('-'))].join('\\,')
}
