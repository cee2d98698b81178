'use client'

import { useEffect } from 'react'
import { usePlayback } from './playback-context'

/** Near the start or the end there is nothing worth coming back to. Seconds. */
const edge = 5

/**
 * Keeps the place over a reload and a way back in this tab. Draws nothing. `openAt` of a link wins: who follows a link
 * to a second wants that second.
 */
export function KeptPlace({ episodeId, openAt }: { episodeId: string; openAt: number | null }) {
  const playback = usePlayback()
  useEffect(() => {
    const key = `turnrow.place.${episodeId}`
    const keep = () => {
      const { at, duration } = playback.read()
      const worthIt = at > edge && at < duration - edge
      try {
        if (worthIt) sessionStorage.setItem(key, String(at))
        else sessionStorage.removeItem(key)
      } catch {
        // Storage switched off: the film begins at its beginning, which is no loss worth words.
      }
    }
    const place = openAt === null ? readPlace(key) : null
    if (place !== null) playback.place(place)
    window.addEventListener('pagehide', keep)
    return () => {
      window.removeEventListener('pagehide', keep)
      keep()
    }
  }, [playback, episodeId, openAt])
  return null
}

function readPlace(key: string): number | null {
  try {
    const at = Number(sessionStorage.getItem(key))
    return at > edge ? at : null
  } catch {
    return null
  }
}
