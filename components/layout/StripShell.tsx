'use client'

import { useEffect, useRef, useState, type ReactNode } from 'react'

/** The sticky frame of the strip. On phones it is a grid until the page is scrolled, then one row of 40 px. */
export function StripShell({ label, children }: { label: string; children: ReactNode }) {
  const mark = useRef<HTMLDivElement>(null)
  const [stuck, setStuck] = useState(false)

  useEffect(() => {
    if (!mark.current || typeof IntersectionObserver === 'undefined') return
    const observer = new IntersectionObserver(([entry]) => setStuck(entry ? !entry.isIntersecting : false))
    observer.observe(mark.current)
    return () => observer.disconnect()
  }, [])

  return (
    <>
      <div ref={mark} aria-hidden="true" className="h-0" />
      <section
        aria-label={label}
        data-sticky
        data-stuck={stuck || undefined}
        className="request-strip px-gutter"
      >
        <div className="request-strip-cells">{children}</div>
      </section>
    </>
  )
}
