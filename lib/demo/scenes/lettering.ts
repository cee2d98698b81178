import { at, ink, rect, stroke } from './brush'

// Single strokes as a surveyor letters a sheet, 8 units wide and 12 high, so that no font need be installed. Only the
// signs that the pictures use.
const strokes: Record<string, string> = {
  a: 'M7 4V12M7 6Q6 4 4 4Q0.5 4 0.5 8T4 12Q6 12 7 10',
  c: 'M7 5.5Q6 4 4 4Q0.5 4 0.5 8T4 12Q6 12 7 10.5',
  e: 'M0.5 8H7Q7 4 4 4Q0.5 4 0.5 8T4 12Q6 12 7 10.7',
  g: 'M7 4V13Q7 16 4 16Q2 16 1 15M7 6Q6 4 4 4Q0.5 4 0.5 8T4 12Q6 12 7 10',
  h: 'M1 0V12M1 7Q2 4 4 4Q7 4 7 7V12',
  i: 'M4 4V12M4 0.5V1',
  l: 'M2.5 0H4V10Q4 12 6 12',
  m: 'M0 4V12M0 6Q1 4 2.3 4Q4 4 4 6.5V12M4 6.5Q4.5 4 6 4Q8 4 8 6.5V12',
  n: 'M1 4V12M1 7Q2 4 4 4Q7 4 7 7V12',
  o: 'M4 4Q7.3 4 7.3 8T4 12T0.7 8T4 4Z',
  p: 'M1 4V16M1 6Q2 4 4 4Q7.5 4 7.5 8T4 12Q2 12 1 10',
  r: 'M1.5 4V12M1.5 7.5Q3 4 7 4.3',
  s: 'M6.8 5Q5.5 4 4 4Q1 4 1 6T4 8Q7 8.2 7 10T4 12Q2 12 0.8 10.8',
  t: 'M3.5 1V9.5Q3.5 12 6.5 11.7M1 4H6.5',
  u: 'M1 4V9Q1 12 4 12Q6 12 7 9.5M7 4V12',
  F: 'M7.5 0H0V12M0 6H6',
  0: 'M4 0Q7.5 0 7.5 6T4 12Q0.5 12 0.5 6T4 0Z',
  1: 'M1.5 2.5L4.5 0V12M1.5 12H7.5',
  2: 'M0.5 3Q0.5 0 4 0Q7.5 0 7.5 3Q7.5 5.5 0.5 12H8',
  3: 'M0.5 1.5Q2 0 4 0Q7 0 7 3T3 5.8Q7.5 5.8 7.5 9T4 12Q1.5 12 0 10.5',
  4: 'M6 12V0L0 8.5H8',
  5: 'M7 0H1.5L1 5.5Q2.5 4.5 4 4.5Q7.5 4.5 7.5 8.2T4 12Q1.5 12 0 10.5',
  6: 'M6.5 0.5Q0.5 2 0.5 8Q0.5 12 4 12T7.5 8.3T4 5Q1.5 5 0.5 7.5',
  7: 'M0 0H8L3 12',
  8: 'M4 0Q7 0 7 2.9T4 5.8T1 2.9T4 0ZM4 5.8Q7.7 5.8 7.7 8.9T4 12T0.3 8.9T4 5.8Z',
  9: 'M1.5 11.5Q7.5 10 7.5 4Q7.5 0 4 0T0.5 3.7T4 7Q6.5 7 7.5 4.5',
  '.': 'M3.7 11.8L4.3 11.8',
  ',': 'M4 11.5L3 14',
  '%': 'M7.5 0L0.5 12M2 1Q3.5 1 3.5 2.7T2 4.4T0.5 2.7T2 1ZM6 7.6Q7.5 7.6 7.5 9.3T6 11T4.5 9.3T6 7.6Z',
  '°': 'M4 0Q5.8 0 5.8 1.9T4 3.8T2.2 1.9T4 0Z',
  '-': 'M1 6.5H7',
  '×': 'M1 3.5L7 9.5M7 3.5L1 9.5',
  '÷': 'M0.5 6.5H7.5M3.9 2.7H4.1M3.9 10.3H4.1',
  '=': 'M1 4.5H7M1 8.5H7',
  '/': 'M7 0L1 12',
}

const step = 12.5

/** Text in strokes, its top left at x, y, figures `size` high. Throws where a sign has no drawing. */
export function letters(x: number, y: number, size: number, text: string, colour: string): string {
  const marks = [...text].map((sign, index) => {
    if (sign === ' ') return ''
    const d = strokes[sign]
    if (!d) throw new Error(`no drawing of "${sign}"`)
    return at(index * step, 0, stroke(d, colour, 1.5))
  })
  return at(x, y, marks.join(''), { scale: size / 12 })
}

export const lettersWide = (size: number, text: string) => ((text.length * step - 4.5) * size) / 12

/** The one label a picture may have: on a plate, so that it reads on any ground. */
export function label(x: number, y: number, text: string, size = 30): string {
  const pad = size * 0.8
  return (
    rect(x, y, lettersWide(size, text) + pad * 2, size + pad * 1.5, ink.plate) +
    letters(x + pad, y + pad * 0.75, size, text, ink.white)
  )
}
