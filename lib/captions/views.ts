/** Something about a cue that a reader would stumble over. */
export type Finding = { level: 'error' | 'warning'; message: string }
export type CueView = { start: number; end: number; text: string; speaker: string | null; findings: Finding[] }
export type TrackView = {
  language: string
  label: string
  kind: string
  checked: boolean
  url: string
  cues: CueView[]
  /** What was put right while reading the file, by line. */
  notes: { line: number; message: string }[]
}

/** A language in its own words: `es` is “español”. */
export function languageLabel(language: string): string {
  try {
    const label = new Intl.DisplayNames([language], { type: 'language' }).of(language) ?? language
    return label.charAt(0).toLocaleUpperCase(language) + label.slice(1)
  } catch {
    return language
  }
}
