'use client'

import { useEffect, useSyncExternalStore } from 'react'
import { type FilmSending, type Sending, sendingTo } from './film-sending'

const nothing: Sending = { phase: 'none' }

/** The film that this window is sending to an episode, and a warning before the window is closed over it. */
export function useSending(episodeId: string): { sending: FilmSending; state: Sending } {
  const sending = sendingTo(episodeId)
  const state = useSyncExternalStore(sending.subscribe, sending.now, () => nothing)
  const isActive = state.phase === 'sending' || state.phase === 'offline'
  useEffect(() => {
    if (!isActive) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [isActive])
  return { sending, state }
}
