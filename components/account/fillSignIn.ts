const name = 'noctuary:fill-sign-in'

export interface Filling {
  email: string
  password: string
}

/** Asks the sign-in form on this page to take these values. */
export function fillSignIn(filling: Filling): void {
  window.dispatchEvent(
    new CustomEvent<Filling>(name, { detail: { email: filling.email, password: filling.password } }),
  )
}

/** Listens for values to take; returns how to stop. */
export function onFillSignIn(take: (filling: Filling) => void): () => void {
  const listener = (event: Event) => {
    if (event instanceof CustomEvent) take(event.detail as Filling)
  }
  window.addEventListener(name, listener)
  return () => window.removeEventListener(name, listener)
}
