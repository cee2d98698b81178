import fc from 'fast-check'
import { WebVTTParser } from 'webvtt-parser'
import { describe, expect, it } from 'vitest'
import { readCaptionFile } from '@/media/caption-file'
import { escapeCueText } from '@/media/cues'
import { readWebVtt, writeChaptersVtt, writeWebVtt } from '@/media/webvtt'

/** The parser's default table forgets the semicolon. */
const semicolons = { '&amp;': '&', '&lt;': '<', '&gt;': '>' } as const

const file = (text: string | Uint8Array, name = 'captions.vtt') =>
  readCaptionFile(typeof text === 'string' ? new TextEncoder().encode(text) : text, name)
const times = (cues: { startMs: number; endMs: number }[]) => cues.map((cue) => [cue.startMs, cue.endMs])

describe('reading WebVTT', () => {
  it('reads times with and without hours, speakers, mark-up and settings', () => {
    const read = file(
      'WEBVTT - spring\n\nNOTE made by hand\n\n1\n00:01.000 --> 00:04.500 align:start line:0\n<v Nell>Nineteen <i>plants</i> &amp; counting\n\n01:00:00.000 --> 01:00:02.000\nLater\n',
    )
    expect(read.errors).toEqual([])
    expect(read.cues).toEqual([
      {
        startMs: 1000,
        endMs: 4500,
        text: '<v Nell>Nineteen <i>plants</i> &amp; counting</v>',
        plain: 'Nineteen plants & counting',
        speaker: 'Nell',
        settings: 'line:0 align:start',
      },
      { startMs: 3_600_000, endMs: 3_602_000, text: 'Later', plain: 'Later', speaker: null, settings: '' },
    ])
  })

  it.each([
    ['no signature', '00:01.000 --> 00:02.000\nx\n', 1],
    ['a comma for the thousandths', 'WEBVTT\n\n00:01.000 --> 00:02.000\nx\n\n00:03,000 --> 00:04,000\ny\n', 6],
    ['an end before its start', 'WEBVTT\n\n00:01.000 --> 00:02.000\nx\n\n00:05.000 --> 00:04.000\ny\n', 6],
    ['words after a blank line inside a caption', 'WEBVTT\n\n00:01.000 --> 00:02.000\nx\n\nlost\n', 6],
    ['a script', 'WEBVTT\n\n00:01.000 --> 00:02.000\nfine\n<script>alert(1)</script>\n', 5],
    ['sixty seconds in a minute', 'WEBVTT\n\n00:01.000 --> 00:60.000\nx\n', 3],
    ['nothing at all', 'WEBVTT\n', 1],
  ])('says in which line there is %s', (_what, text, line) => {
    const { errors } = file(text)
    expect(errors[0]?.line).toBe(line)
    expect(errors[0]?.message.length).toBeGreaterThan(10)
  })

  it('takes byte order marks, all line ends, regions and the header line of HLS without complaint', () => {
    const text =
      '\uFEFFWEBVTT\r\nX-TIMESTAMP-MAP=LOCAL:00:00:00.000,MPEGTS:900000\r\n\r\nREGION\r\nid:a\r\nlines:3\r\n\r\n00:01.000 --> 00:02.000 region:a\r\nx\r\n'
    expect(file(text)).toMatchObject({ errors: [], cues: [{ startMs: 1000, text: 'x', settings: '' }] })
    expect(file(text.replaceAll('\r\n', '\r'))).toMatchObject({ errors: [], cues: [{ startMs: 1000 }] })
  })

  it('lets no style through, for a style can fetch an address', () => {
    const read = file(
      'WEBVTT\n\nSTYLE\n::cue { background: url(http://far.example/x) }\n\n00:01.000 --> 00:02.000\nx\n',
    )
    expect(read.errors).toEqual([])
    expect(writeWebVtt(read.cues)).not.toContain('url')
  })

  it('refuses more mark-up than anyone writes, before it can exhaust the parser', () => {
    const nested = `WEBVTT\n\n00:01.000 --> 00:02.000\n${'<b>'.repeat(1000)}x\n`
    expect(file(nested).errors).toEqual([{ line: 4, message: 'There is too much mark-up in this caption.' }])
    expect(file(`WEBVTT\n\n${'x'.repeat(6_000_000)}`).errors).toHaveLength(1)
  })
})

describe('writing WebVTT', () => {
  it('gives back the same cues through the W3C parser without a fault', () => {
    const words = fc.array(fc.string({ minLength: 1, maxLength: 30, unit: 'grapheme' }), { minLength: 1, maxLength: 2 })
    const cue = fc.record({
      startMs: fc.integer({ min: 0, max: 20_000_000 }),
      length: fc.integer({ min: 1, max: 9000 }),
      words,
    })
    fc.assert(
      fc.property(fc.array(cue, { minLength: 1, maxLength: 20 }), (drawn) => {
        const cues = drawn
          .map(({ startMs, length, words: lines }) => ({
            startMs,
            endMs: startMs + length,
            text: lines.map((line) => escapeCueText(line.replace(/[\r\n\0]/g, ' ').trim() || 'x')).join('\n'),
            settings: '',
          }))
          .sort((a, b) => a.startMs - b.startMs || b.endMs - a.endMs)
        const written = writeWebVtt(cues)
        expect(new WebVTTParser().parse(written, 'subtitles').errors).toEqual([])
        expect(
          readWebVtt(written).cues.map(({ startMs, endMs, text, settings }) => ({ startMs, endMs, text, settings })),
        ).toEqual(cues)
      }),
      { numRuns: 300 },
    )
  })

  it('keeps settings and mark-up over a round trip', () => {
    const text =
      'WEBVTT\n\n00:00:01.000 --> 00:00:02.000 vertical:rl line:-1 position:30%,line-left size:40% align:end\n<v Nell><b.loud>Stop</b> <ruby>汉<rt>han</rt></ruby></v>\n'
    expect(writeWebVtt(file(text).cues)).toBe(text)
  })

  it('writes chapters that the W3C parser takes as chapters, whatever is in the title', () => {
    const written = writeChaptersVtt([
      { startMs: 0, endMs: 209_200, title: 'Calibrating  without\na scale' },
      { startMs: 209_200, endMs: 300_000, title: 'Seed --> soil <contact> & depth' },
    ])
    const { cues, errors } = new WebVTTParser(semicolons).parse(written, 'chapters')
    expect(errors).toEqual([])
    expect(cues.map((cue) => [cue.startTime, cue.tree.children[0]])).toEqual([
      [0, { type: 'text', value: 'Calibrating without a scale' }],
      [209.2, { type: 'text', value: 'Seed --> soil <contact> & depth' }],
    ])
  })
})

describe('reading SubRip, which has no standard (cases: common practice, no source)', () => {
  const srt = (text: string | Uint8Array) => file(text, 'captions.srt')

  it('pads short fractions, takes a full stop, and does without hours', () => {
    const read = srt('1\n00:00:01,5 --> 00:00:02.25\none\n\n2\n01:03,040 --> 01:04\ntwo\n')
    expect(read.errors).toEqual([])
    expect(times(read.cues)).toEqual([
      [1500, 2250],
      [63_040, 64_000],
    ])
  })

  it('needs no counters and does not lose the first cue behind a byte order mark', () => {
    const read = srt('\uFEFF00:00:01,000 --> 00:00:02,000\r\nfirst\r\n00:00:03,000 --> 00:00:04,000\r\nsecond 42\r\n')
    expect(read.cues.map((cue) => cue.plain)).toEqual(['first', 'second 42'])
  })

  it('keeps a caption that is only a number, and drops the counter below it', () => {
    const read = srt('1\n00:00:01,000 --> 00:00:02,000\n19\n\n2\n00:00:03,000 --> 00:00:04,000\nplants\n')
    expect(read.cues.map((cue) => cue.plain)).toEqual(['19', 'plants'])
  })

  it('drops fonts, commands and places, keeps italics, and treats the rest as words', () => {
    const read = srt(
      '1\n00:00:01,000 --> 00:00:02,000 X1:100 X2:200 Y1:10 Y2:20\n{\\an8}<font color="red">wet</font> <I>soil</I> & moisture < 20 %\n<script>x</script>\n',
    )
    expect(read.errors).toEqual([])
    expect(read.cues[0]?.text).toBe('wet <i>soil</i> &amp; moisture &lt; 20 %\nx')
  })

  it('reads old Latin files letter by letter', () => {
    const latin = Buffer.from('1\n00:00:01,000 --> 00:00:02,000\nK\xfcrbis \x96 \xbd\n', 'latin1')
    expect(srt(latin).cues[0]?.plain).toBe('Kürbis – ½')
  })

  it('reads UTF-16 by its mark', () => {
    const wide = Buffer.concat([
      Buffer.from([0xff, 0xfe]),
      Buffer.from('1\n00:00:01,000 --> 00:00:02,000\nñame\n', 'utf16le'),
    ])
    expect(srt(wide).cues[0]?.plain).toBe('ñame')
  })

  it('puts captions in order, and names the line of one that ends before it begins', () => {
    expect(times(srt('2\n00:00:05,000 --> 00:00:06,000\nb\n\n1\n00:00:01,000 --> 00:00:02,000\na\n').cues)).toEqual([
      [1000, 2000],
      [5000, 6000],
    ])
    expect(srt('1\n00:00:01,000 --> 00:00:02,000\na\n\n2\n00:00:05,000 --> 00:00:04,000\nb\n').errors).toEqual([
      { line: 6, message: 'This caption ends before it begins.' },
    ])
    expect(srt('1\n00:00:01 --> later\nx\n').errors[0]?.line).toBe(2)
    expect(srt('only words').errors).toHaveLength(1)
  })
})
