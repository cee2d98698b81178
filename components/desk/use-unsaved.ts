'use client'

import { useEffect } from 'react'

/** Asks before the page is left while something on it is not saved. */
export function useUnsaved(unsaved: boolean): void {
  useEffect(() => {
    if (!unsaved) return
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [unsaved])
}
