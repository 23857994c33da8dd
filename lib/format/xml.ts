/** A piece of XML, escaped already. */
export interface Xml {
  readonly markup: string
}

const references: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  '\t': '&#9;',
  '\n': '&#10;',
  '\r': '&#13;',
}

/** What XML 1.0 (section 2.2) has no place for: most control characters, half surrogate pairs, two non-characters. */
// eslint-disable-next-line no-control-regex -- these are the characters to be kept out
const unwritable = /[\u0000-\u0008\u000B\u000C\u000E-\u001F\uFFFE\uFFFF]|\p{Surrogate}/gu

const escaped = (text: string, what: RegExp): string =>
  text.replace(unwritable, '\uFFFD').replace(what, (character) => references[character] ?? character)

/** An element; text among its children and every attribute is escaped. Attributes that are undefined are left out. */
export function xml(
  name: string,
  attributes: Readonly<Record<string, string | number | undefined>>,
  ...children: readonly (Xml | string)[]
): Xml {
  const given = Object.entries(attributes).flatMap(([key, value]) =>
    value === undefined ? [] : [` ${key}="${escaped(String(value), /[&<>"\t\n\r]/g)}"`],
  )
  const inside = children.map((child) =>
    typeof child === 'string' ? escaped(child, /[&<>\r]/g) : child.markup,
  )
  const start = `<${name}${given.join('')}`
  return { markup: inside.length > 0 ? `${start}>${inside.join('')}</${name}>` : `${start}/>` }
}

/** A whole document of one element, UTF-8. */
export const xmlDocument = (root: Xml): string => `<?xml version="1.0" encoding="UTF-8"?>\n${root.markup}\n`
