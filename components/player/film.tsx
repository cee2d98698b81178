'use client'

import { useRef, type KeyboardEvent } from 'react'
import { TimeCode } from '@/components/ui/time-code'
import { FilmControls } from './film-controls'
import { FilmNotice } from './film-notice'
import { useKeptChoice } from './kept-choice'
import { asChoice, pictureOptions, type FilmSize } from './picture-sizes'
import { useMoment, usePlayback } from './playback-context'
import { placeAfterKey } from './player-keys'
import { useFilm } from './use-film'
import { useHydrated } from '@/components/ui/use-hydrated'

export type CaptionTrack = { language: string; label: string; url: string }

type FilmProps = {
  title: string
  film: { hls: string; plain: string; poster: string | null; sizes: FilmSize[] }
  captions: CaptionTrack[]
  /** Where the link points to, in seconds. Without JavaScript the browser opens the plain file there. */
  openAt: number
}

/** The picture with its controls. Without JavaScript: the browser's own player on the plain file. */
export function Film({ title, film, captions, openAt }: FilmProps) {
  const frame = useRef<HTMLDivElement>(null)
  const scripted = useHydrated()
  const [size, keepSize] = useKeptChoice(
    'picture',
    pictureOptions(film.sizes).map((option) => option.value),
    'auto',
  )
  const languages = captions.map((track) => track.language)
  const [language, keepLanguage] = useKeptChoice('captions', [...languages, 'off'], languages[0] ?? 'off')
  const { video, shown } = useFilm(film, { choice: asChoice(size), language, openNow: openAt > 0 })
  const onKeyDown = useFilmKeys()

  return (
    <div ref={frame} className="on-dark group/film @container flex flex-col bg-loam text-on-loam">
      <div className="relative min-h-0 flex-1">
        <video
          ref={video}
          className="group-fullscreen/film:h-full group-fullscreen/film:max-h-none block aspect-video max-h-[80vh] w-full bg-loam object-contain -outline-offset-3 max-lg:[@media(min-height:36em)]:max-h-[45vh]"
          aria-label={`Film: ${title}`}
          poster={film.poster ?? undefined}
          preload={openAt > 0 ? 'metadata' : 'none'}
          controls={!scripted}
          tabIndex={0}
          playsInline
          onKeyDown={onKeyDown}
          onClick={useToggle(scripted)}
        >
          <source src={openAt > 0 ? `${film.plain}#t=${openAt}` : film.plain} type="video/mp4" />
          {captions.map((track, at) => (
            <track
              key={track.language}
              kind="captions"
              src={track.url}
              srcLang={track.language}
              label={track.label}
              default={at === 0}
            />
          ))}
        </video>
        <FilmNotice soundOnly={size === 'sound'} />
      </div>
      {scripted ? (
        <FilmControls
          frame={frame}
          video={video}
          sizes={film.sizes}
          shown={shown}
          size={size}
          onSize={keepSize}
          captions={captions}
          language={language}
          onLanguage={keepLanguage}
        />
      ) : (
        <RestingBar />
      )}
    </div>
  )
}

/** The place of the controls until the page answers, so that nothing moves when they come. */
function RestingBar() {
  const duration = useMoment((moment) => moment.duration)
  return (
    <p className="flex min-h-12 items-center px-3.5 text-sm @min-[44rem]:px-4.5">
      <span>
        Length <TimeCode seconds={duration} />
      </span>
    </p>
  )
}

function useToggle(scripted: boolean) {
  const playback = usePlayback()
  // Before the page answers, the browser's own controls take the press.
  return scripted ? () => playback.toggle() : undefined
}

/** Keys count only while the picture has the focus (WCAG 2.1.4). */
function useFilmKeys() {
  const playback = usePlayback()
  return (event: KeyboardEvent) => {
    if (event.altKey || event.ctrlKey || event.metaKey) return
    const { volume } = playback.read()
    if (event.key === ' ') playback.toggle()
    else if (event.key === 'ArrowUp') playback.setVolume(volume + 0.1)
    else if (event.key === 'ArrowDown') playback.setVolume(volume - 0.1)
    else {
      const to = placeAfterKey(event.key, playback.read(), [])
      if (to === null || event.key.startsWith('Page')) return
      playback.seek(to)
    }
    event.preventDefault()
  }
}
