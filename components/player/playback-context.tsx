'use client'

import { createContext, useContext, useState, useSyncExternalStore, type ReactNode } from 'react'
import { Playback, type Moment } from './playback'

const PlaybackContext = createContext<Playback | null>(null)

type PlaybackProviderProps = { at: number; duration: number; children: ReactNode }

/** Gives everything under it one film to follow and to move. Seconds. */
export function PlaybackProvider({ at, duration, children }: PlaybackProviderProps) {
  const [playback] = useState(() => new Playback(at, duration))
  return <PlaybackContext value={playback}>{children}</PlaybackContext>
}

/** The film's controls; reading it never renders anything again. */
export function usePlayback(): Playback {
  const playback = useContext(PlaybackContext)
  if (!playback) throw new Error('usePlayback needs a PlaybackProvider above it')
  return playback
}

/**
 * One value of the film's moment; the component renders again only when that value changes, so choose small:
 * whole seconds, a chapter's place, yes or no.
 */
export function useMoment<T extends string | number | boolean | null>(choose: (moment: Moment) => T): T {
  const playback = usePlayback()
  return useSyncExternalStore(
    playback.subscribe,
    () => choose(playback.read()),
    () => choose(playback.readFirst()),
  )
}

export const wholeSecond = (moment: Moment) => Math.floor(moment.at)
