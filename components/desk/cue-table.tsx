import { Cell, HeadCell, Row, Table } from '@/components/ui/table'
import { TimeCode } from '@/components/ui/time-code'
import type { TrackView } from '@/lib/captions/views'

/** The lines of one language, with what a reader would stumble over. */
export function CueTable({ track }: { track: TrackView }) {
  const found = track.cues.filter(({ findings }) => findings.length > 0).length
  return (
    <section aria-label={`Captions in ${track.label}`} className="grid gap-2">
      <h3>{track.label}</h3>
      <p className="text-sm text-ink-2">
        {track.cues.length} lines, {found === 0 ? 'none hard to read' : `${found} hard to read`}.{' '}
        <a href={track.url} download>
          Download as WebVTT
        </a>
      </p>
      <Table caption={`Lines in ${track.label}`}>
        <thead>
          <tr>
            <HeadCell>From</HeadCell>
            <HeadCell>To</HeadCell>
            <HeadCell>Said</HeadCell>
            <HeadCell>To mend</HeadCell>
          </tr>
        </thead>
        <tbody>
          {track.cues.map(({ start, end, text, findings }) => (
            <Row key={`${start} ${end} ${text}`}>
              <Cell>
                <TimeCode seconds={start} />
              </Cell>
              <Cell>
                <TimeCode seconds={end} />
              </Cell>
              <Cell className="whitespace-pre-line" lang={track.language}>
                {text}
              </Cell>
              <Cell className="text-sm text-ink-2">{findings.map(({ message }) => message).join(' ')}</Cell>
            </Row>
          ))}
        </tbody>
      </Table>
    </section>
  )
}
