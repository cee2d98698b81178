import { Cell, HeadCell, Row, Table } from '@/components/ui/table'
import { sizeWords } from '@/lib/footage/rules'
import type { RenditionView } from '@/lib/footage/views'

/** What a minute of watching takes from a viewer's line, by size. */
export function FootageSizes({ renditions }: { renditions: RenditionView[] }) {
  if (renditions.length === 0) return null
  return (
    <Table caption="Sizes that are ready">
      <thead>
        <tr>
          <HeadCell>Size</HeadCell>
          <HeadCell>A minute of watching</HeadCell>
          <HeadCell>The whole film</HeadCell>
        </tr>
      </thead>
      <tbody>
        {renditions.map(({ height, bitrate, bytes }) => (
          <Row key={height}>
            <Cell className="font-semibold">{height} lines</Cell>
            <Cell className="font-mono tabular-nums">{sizeWords((bitrate * 60) / 8)}</Cell>
            <Cell className="font-mono tabular-nums">{sizeWords(bytes)}</Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  )
}
