'use client'

import { useEffect, useRef, useState } from 'react'
import { HlsFilmSource, type PictureChoice } from './film-source'
import { usePlayback } from './playback-context'

type FilmWishes = {
  choice: PictureChoice
  /** Which captions stand in the picture; a language that is not there is none. */
  language: string
  /** Fetch at once and not at the first press. */
  openNow: boolean
}

/** Joins a `<video>` to the page's playback. `shown` is the height of the picture on screen, once that is known. */
export function useFilm({ hls, plain }: { hls: string; plain: string }, { choice, language, openNow }: FilmWishes) {
  const playback = usePlayback()
  const video = useRef<HTMLVideoElement>(null)
  const source = useRef<HlsFilmSource>(null)
  const [shown, setShown] = useState<number | null>(null)

  useEffect(() => {
    if (!video.current) return
    const film = new HlsFilmSource(
      video.current,
      { hls, plain },
      {
        happened: (event) => playback.happened(event),
        keepPlace: () => playback.keepPlace(),
        shows: setShown,
      },
    )
    source.current = film
    const detach = playback.attach(video.current, film)
    if (!video.current.paused) film.adopt()
    return () => {
      detach()
      film.close()
      source.current = null
    }
  }, [playback, hls, plain])

  useEffect(() => source.current?.choose(choice), [choice])

  useEffect(() => {
    const tracks = video.current?.textTracks
    if (!tracks) return
    // Chromium turns a second language on by itself after the tracks are there (seen with version 156).
    const show = () => showCaptions(tracks, language)
    show()
    tracks.addEventListener('change', show)
    return () => tracks.removeEventListener('change', show)
  }, [language])

  useEffect(() => {
    // A link to a second shows the picture of that second; otherwise nothing is fetched before the first press.
    if (openNow) playback.seek(playback.read().at)
  }, [playback, openNow])

  useEffect(() => {
    const lineIsBack = () => playback.read().phase === 'broken' && playback.seek(playback.read().at)
    window.addEventListener('online', lineIsBack)
    return () => window.removeEventListener('online', lineIsBack)
  }, [playback])

  return { video, shown }
}

function showCaptions(tracks: TextTrackList, language: string) {
  for (const track of tracks) {
    const mode = track.language === language ? 'showing' : 'disabled'
    // Setting a mode, even to what it is, raises the event that leads here.
    if (track.mode !== mode) track.mode = mode
  }
}
