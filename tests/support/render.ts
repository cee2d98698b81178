import { act, type ReactNode } from 'react'
import { createRoot } from 'react-dom/client'

declare global {
  // React asks for this flag before it lets `act` wait for it.
  var IS_REACT_ACT_ENVIRONMENT: boolean | undefined
}

/** Puts a component into the page of a jsdom test. `rerender` gives it new props, `unmount` takes it away. */
export function render(first: ReactNode) {
  globalThis.IS_REACT_ACT_ENVIRONMENT = true
  // jsdom lays nothing out and so cannot scroll or watch sizes.
  Element.prototype.scrollIntoView ??= () => undefined
  globalThis.ResizeObserver ??= class {
    observe() {}
    unobserve() {}
    disconnect() {}
  }
  const page = document.createElement('div')
  document.body.append(page)
  const root = createRoot(page)
  const rerender = (node: ReactNode) => act(() => root.render(node))
  rerender(first)
  const unmount = () => {
    act(() => root.unmount())
    page.remove()
  }
  return { page, rerender, unmount }
}

/** A key pressed where the focus is. Returns whether the browser's own answer was left standing. */
export function press(key: string, target: Element | null = document.activeElement): boolean {
  let left = true
  act(() => {
    left = target?.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true })) ?? true
  })
  return left
}

export function click(target: Element | null | undefined, init: MouseEventInit = {}): boolean {
  let left = true
  act(() => {
    left = target?.dispatchEvent(new MouseEvent('click', { bubbles: true, cancelable: true, ...init })) ?? true
  })
  return left
}

/** Types into a field as a person does: the value changes, then the input event says so. */
export function typeInto(field: HTMLInputElement, value: string) {
  act(() => {
    field.focus()
    Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set?.call(field, value)
    field.dispatchEvent(new Event('input', { bubbles: true }))
  })
}
