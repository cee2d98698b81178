'use client'

import { useSyncExternalStore } from 'react'

/** The width from which text and picture stand side by side; Tailwind's `lg`. */
const wide = '(min-width: 64rem)'

function subscribe(listener: () => void) {
  const query = matchMedia(wide)
  query.addEventListener('change', listener)
  return () => query.removeEventListener('change', listener)
}

/** Null as the server drew it and without JavaScript: then everything is shown. */
export const useWide = () =>
  useSyncExternalStore<boolean | null>(
    subscribe,
    () => matchMedia(wide).matches,
    () => null,
  )
