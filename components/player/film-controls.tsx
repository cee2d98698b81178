'use client'

import { useState, type RefObject } from 'react'
import { TimeCode } from '@/components/ui/time-code'
import { BarChoice } from './bar-choice'
import type { CaptionTrack } from './film'
import { FilmWindow } from './film-window'
import { asChoice, pictureOptions, pictureWords, type FilmSize } from './picture-sizes'
import { useMoment, usePlayback, wholeSecond } from './playback-context'

type FilmControlsProps = {
  frame: RefObject<HTMLDivElement | null>
  video: RefObject<HTMLVideoElement | null>
  sizes: FilmSize[]
  /** Height of the picture on screen. */
  shown: number | null
  size: string
  onSize: (size: string) => void
  captions: CaptionTrack[]
  language: string
  onLanguage: (language: string) => void
}

/** The bar under the picture: words, not icons. What does not fit a phone stands behind "More". */
export function FilmControls(props: FilmControlsProps) {
  const [more, setMore] = useState(false)
  const picture = pictureWords(asChoice(props.size), props.shown, props.sizes)
  return (
    <div className="flex flex-wrap items-center gap-x-3 px-3.5 py-0.5 text-sm @min-[44rem]:gap-x-4 @min-[44rem]:px-4.5">
      <PlayButton />
      <Clock />
      <BarChoice
        label="Picture and data"
        value={props.size}
        options={pictureOptions(props.sizes)}
        onChoose={props.onSize}
        className="ml-auto @min-[44rem]:order-3 @min-[44rem]:ml-0"
      >
        <span className="@min-[44rem]:hidden">{picture.short}</span>
        <span className="hidden @min-[44rem]:inline">{picture.full}</span>
      </BarChoice>
      <button type="button" aria-expanded={more} onClick={() => setMore(!more)} className={`${word} order-4`}>
        {more ? 'Less' : 'More'}
      </button>
      <div
        className={`${more ? 'flex' : 'hidden'} order-5 w-full flex-wrap items-center gap-x-4 @min-[44rem]:order-2 @min-[44rem]:ml-auto @min-[44rem]:flex @min-[44rem]:w-auto`}
      >
        <CaptionChoice captions={props.captions} language={props.language} onLanguage={props.onLanguage} />
        <SpeedChoice />
      </div>
      {more && (
        <div className="order-6 flex w-full flex-wrap items-center gap-x-4">
          <VolumeSlider />
          <FilmWindow frame={props.frame} video={props.video} />
        </div>
      )}
    </div>
  )
}

const word = 'inline-flex min-h-11 items-center hover:underline'

function PlayButton() {
  const playback = usePlayback()
  const playing = useMoment((moment) => moment.playing)
  return (
    <button type="button" onClick={() => playback.toggle()} className={`${word} min-w-12 text-base font-semibold`}>
      {playing ? 'Pause' : 'Play'}
    </button>
  )
}

function Clock() {
  const second = useMoment(wholeSecond)
  const duration = useMoment((moment) => moment.duration)
  return (
    <span className="font-mono whitespace-nowrap tabular-nums">
      <TimeCode seconds={second} /> / <TimeCode seconds={duration} />
    </span>
  )
}

type CaptionChoiceProps = Pick<FilmControlsProps, 'captions' | 'language' | 'onLanguage'>

function CaptionChoice({ captions, language, onLanguage }: CaptionChoiceProps) {
  if (captions.length === 0) return <span className={word}>No captions yet</span>
  const options = [
    { value: 'off', label: 'Off' },
    ...captions.map((track) => ({ value: track.language, label: track.label })),
  ]
  return (
    <BarChoice label="Captions" value={language} options={options} onChoose={onLanguage}>
      Captions: {captions.find((track) => track.language === language)?.label ?? 'off'}
    </BarChoice>
  )
}

const speeds = [0.5, 0.75, 1, 1.25, 1.5, 2]

function SpeedChoice() {
  const playback = usePlayback()
  const rate = useMoment((moment) => moment.rate)
  const options = speeds.map((speed) => ({ value: String(speed), label: `${speed}×` }))
  return (
    <BarChoice
      label="Speed"
      value={String(rate)}
      options={options}
      onChoose={(value) => playback.setRate(Number(value))}
    >
      Speed {rate}×
    </BarChoice>
  )
}

function VolumeSlider() {
  const playback = usePlayback()
  const volume = useMoment((moment) => (moment.muted ? 0 : moment.volume))
  return (
    <label className={`${word} gap-2`}>
      Sound
      <input
        type="range"
        min={0}
        max={1}
        step={0.05}
        value={volume}
        aria-valuetext={volume === 0 ? 'Off' : `${Math.round(volume * 100)} percent`}
        onChange={(event) => playback.setVolume(Number(event.target.value))}
        className="h-6 w-28 accent-on-loam"
      />
    </label>
  )
}
