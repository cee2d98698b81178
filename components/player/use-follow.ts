'use client'

import { useEffect, useState, type RefObject } from 'react'
import { isReading, scrollNeeded } from './follow-rules'
import { usePlayback } from './playback-context'

const readerEvents = ['wheel', 'touchmove', 'keydown', 'pointerdown'] as const
/** Presses and keys in here belong to a control, not to the page's scrolling. */
const controls = '[role="slider"], input, select, textarea, button, a, video'

/** A wide page scrolls the text in its own box; a narrow one scrolls the whole page under the picture. */
const scrollsItself = (box: HTMLElement) => getComputedStyle(box).overflowY === 'auto'

/**
 * Keeps the spoken sentence in view until the reader scrolls away, and again from `resume` on. `now` is the place of
 * that sentence, -1 for none; its element carries `data-now`.
 */
export function useFollow(box: RefObject<HTMLElement | null>, now: number) {
  const playback = usePlayback()
  const [following, setFollowing] = useState(true)

  useEffect(() => {
    const stop = (event: Event) => {
      if (box.current && leavesThePicture(event, box.current)) setFollowing(false)
    }
    for (const type of readerEvents) window.addEventListener(type, stop, { passive: true })
    return () => {
      for (const type of readerEvents) window.removeEventListener(type, stop)
    }
  }, [box])

  useEffect(() => {
    const sentence = box.current?.querySelector('[data-now]')
    if (!following || !box.current || !sentence) return
    // A narrow page is not pulled down under someone who has not pressed play.
    if (scrollsItself(box.current) || playback.read().playing) bringIntoView(sentence, box.current)
  }, [box, playback, following, now])

  return { following, resume: () => setFollowing(true) }
}

function leavesThePicture(event: Event, box: HTMLElement): boolean {
  const target = event.target instanceof Element ? event.target : null
  const own = scrollsItself(box)
  if (own && !(target && box.contains(target))) return false
  // A press on the box itself, beside all text, is a hand on its scroll bar.
  if (event.type === 'pointerdown') return own && target === box
  if (event.type !== 'wheel' && target?.closest(controls)) return false
  return isReading(event as KeyboardEvent)
}

function bringIntoView(sentence: Element, box: HTMLElement) {
  const own = scrollsItself(box)
  const { top, bottom } = sentence.getBoundingClientRect()
  const by = scrollNeeded({ top, bottom }, own ? box.getBoundingClientRect() : viewUnderPicture())
  if (by === 0) return
  const still = matchMedia('(prefers-reduced-motion: reduce)').matches
  const scroller = own ? box : window
  scroller.scrollBy({ top: by, behavior: still ? 'auto' : 'smooth' })
}

/** What is left of the window between the picture that sticks to its top and the bar at its foot. */
function viewUnderPicture() {
  const edge = (name: string) => document.querySelector(`[data-sticks="${name}"]`)?.getBoundingClientRect()
  const top = Math.max(0, edge('top')?.bottom ?? 0)
  return { top, bottom: Math.min(window.innerHeight, edge('foot')?.top ?? window.innerHeight) }
}
