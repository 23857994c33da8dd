import { cleanup, configure } from '@testing-library/react'
import { afterEach } from 'vitest'

afterEach(cleanup)
// A page may be as slow as a busy machine; how fast it is, benchmarks tell.
configure({ asyncUtilTimeout: 15_000 })

// What floating panels and sliders ask of a browser, and jsdom does not have.
globalThis.ResizeObserver ??= class {
  observe() {}
  unobserve() {}
  disconnect() {}
}
Element.prototype.hasPointerCapture ??= () => false
Element.prototype.setPointerCapture ??= () => undefined
Element.prototype.scrollIntoView ??= () => undefined
