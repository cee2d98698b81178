'use client'

import { useCallback, useSyncExternalStore } from 'react'

/** Tells the other components of this page; the browser tells other tabs only. */
const changed = new EventTarget()

function subscribe(listener: () => void) {
  changed.addEventListener('change', listener)
  window.addEventListener('storage', listener)
  return () => {
    changed.removeEventListener('change', listener)
    window.removeEventListener('storage', listener)
  }
}

/** Storage may be switched off or full; then a choice holds for this page only, in memory. */
const memory = new Map<string, string>()

function read(key: string): string | null {
  if (memory.has(key)) return memory.get(key) ?? null
  try {
    return localStorage.getItem(key)
  } catch {
    return null
  }
}

function write(key: string, value: string) {
  try {
    localStorage.setItem(key, value)
  } catch {
    memory.set(key, value)
  }
  changed.dispatchEvent(new Event('change'))
}

/** A small choice about watching that this browser remembers. What is stored and no longer offered counts as unset. */
export function useKeptChoice(name: string, offered: readonly string[], unset: string) {
  const key = `turnrow.${name}`
  const kept = useSyncExternalStore(
    subscribe,
    () => read(key),
    () => null,
  )
  const keep = useCallback((value: string) => write(key, value), [key])
  return [kept !== null && offered.includes(kept) ? kept : unset, keep] as const
}
