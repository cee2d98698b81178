/** When the first picture of a segment is shown and whether it stands alone, from its boxes (ISO/IEC 14496-12: tfdt, tfhd, trun). */
export function firstPicture(segment: Buffer, init: Buffer): { seconds: number; isKey: boolean } {
  const header = init.indexOf('mdhd') + 4
  const timescale = init.readUInt32BE(header + (init[header] === 1 ? 20 : 12))
  const decodeTime = segment.indexOf('tfdt') + 4
  const base =
    segment[decodeTime] === 1 ? Number(segment.readBigUInt64BE(decodeTime + 4)) : segment.readUInt32BE(decodeTime + 4)
  const run = segment.indexOf('trun') + 4
  const flags = segment.readUInt32BE(run) & 0xffffff
  const sample = run + 8 + (flags & 0x1 ? 4 : 0) + (flags & 0x4 ? 4 : 0)
  const beforeOffset = (flags & 0x100 ? 4 : 0) + (flags & 0x200 ? 4 : 0) + (flags & 0x400 ? 4 : 0)
  const ownFlags =
    flags & 0x4
      ? segment.readUInt32BE(run + 8 + (flags & 0x1 ? 4 : 0))
      : segment.readUInt32BE(sample + beforeOffset - 4)
  const offset = flags & 0x800 ? segment.readInt32BE(sample + beforeOffset) : 0
  return { seconds: (base + offset) / timescale, isKey: (ownFlags & 0x10000) === 0 }
}
