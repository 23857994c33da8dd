interface Place {
  href: string
  also?: readonly string[]
}

const within = (pathname: string, base: string) =>
  pathname === base || (base !== '/' && pathname.startsWith(`${base}/`))

/** The link one is at or below; of several, the most particular. */
export function currentLink<Link extends Place>(links: readonly Link[], pathname: string): Link | undefined {
  const fits = links.flatMap((link) =>
    [link.href, ...(link.also ?? [])]
      .filter((base) => within(pathname, base))
      .map((base) => ({ link, base })),
  )
  return fits.sort((a, b) => b.base.length - a.base.length)[0]?.link
}
