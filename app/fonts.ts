import localFont from 'next/font/local'

/** Titles, and figures worth reading from a tractor seat. */
const besley = localFont({
  src: [
    { path: '../fonts/besley-latin-500-normal.woff2', weight: '500' },
    { path: '../fonts/besley-latin-600-normal.woff2', weight: '600' },
    { path: '../fonts/besley-latin-700-normal.woff2', weight: '700' },
  ],
  variable: '--face-besley',
  adjustFontFallback: 'Times New Roman',
})

/** Text and controls: made for hard reading conditions. */
const atkinson = localFont({
  src: [
    { path: '../fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2', weight: '200 800', style: 'normal' },
    { path: '../fonts/atkinson-hyperlegible-next-latin-wght-italic.woff2', weight: '200 800', style: 'italic' },
  ],
  variable: '--face-atkinson',
})

/** Time codes and figures that stand in columns. */
const atkinsonMono = localFont({
  src: '../fonts/atkinson-hyperlegible-mono-latin-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-atkinson-mono',
  preload: false,
  adjustFontFallback: false,
})

// Names from east of the Oder: the range keeps a reader of English or Spanish from loading these two.
const besleyExtended = localFont({
  src: '../fonts/besley-latin-ext-600-normal.woff2',
  weight: '500 700',
  variable: '--face-besley-extended',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-0130, U+0132-0151, U+0154-02BA, U+1E00-1E9F, U+1EF2-1EFF' }],
})

const atkinsonExtended = localFont({
  src: '../fonts/atkinson-hyperlegible-next-latin-ext-wght-normal.woff2',
  weight: '200 800',
  variable: '--face-atkinson-extended',
  preload: false,
  adjustFontFallback: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-0130, U+0132-0151, U+0154-02BA, U+1E00-1E9F, U+1EF2-1EFF' }],
})

/** Class names for `<html>`: they set the variables that the theme in globals.css builds its families from. */
export const fontVariables = [besley, atkinson, atkinsonMono, besleyExtended, atkinsonExtended]
  .map((font) => font.variable)
  .join(' ')
