/** Reads the few MP4 boxes that a playlist must tell the truth about (ISO/IEC 14496-12 and -15). */

/** Codec string (RFC 6381) and size in pixels of an H.264 initialisation segment, from its sample entry and avcC bytes. */
export function describeH264(init: Buffer): { codec: string; width: number; height: number } {
  const entry = init.indexOf('avc1')
  const config = init.indexOf('avcC')
  if (entry < 0 || config < 0) throw new Error('No H.264 sample entry in the initialisation segment')
  // After the type: 6 reserved, 2 data reference, 16 predefined/reserved, then width and height.
  const width = init.readUInt16BE(entry + 4 + 24)
  const height = init.readUInt16BE(entry + 4 + 26)
  // After the type: configuration version, then profile, compatibility and level.
  const codec = `avc1.${init.subarray(config + 5, config + 8).toString('hex')}`
  return { codec, width, height }
}
