/** Rate of Debian's flite voices and of the demo's sound, samples per second. */
export const sampleRate = 16_000

/** Quieter than this (of 32,768) is silence: flite's own padding stays well below, its softest consonants above. */
const silence = 220

const headerBytes = 44

/** Samples of a 16-bit mono WAV file. Throws when the file is of another kind. */
export function samplesOf(wav: Buffer): Int16Array {
  const data = wav.indexOf('data', 12, 'latin1')
  if (data < 0 || wav.readUInt16LE(22) !== 1 || wav.readUInt32LE(24) !== sampleRate) {
    throw new Error('expected 16-bit mono sound at 16 kHz')
  }
  const length = Math.min(wav.readUInt32LE(data + 4), wav.length - data - 8) >> 1
  return Int16Array.from({ length }, (_, index) => wav.readInt16LE(data + 8 + index * 2))
}

/** A WAV file around the samples. */
export function wavOf(samples: Int16Array): Buffer {
  const wav = Buffer.alloc(headerBytes + samples.length * 2)
  wav.write('RIFF', 0, 'latin1')
  wav.writeUInt32LE(wav.length - 8, 4)
  wav.write('WAVEfmt ', 8, 'latin1')
  wav.writeUInt32LE(16, 16)
  wav.writeUInt16LE(1, 20)
  wav.writeUInt16LE(1, 22)
  wav.writeUInt32LE(sampleRate, 24)
  wav.writeUInt32LE(sampleRate * 2, 28)
  wav.writeUInt16LE(2, 32)
  wav.writeUInt16LE(16, 34)
  wav.write('data', 36, 'latin1')
  wav.writeUInt32LE(samples.length * 2, 40)
  Buffer.from(samples.buffer, samples.byteOffset, samples.byteLength).copy(wav, headerBytes)
  return wav
}

/** The stretch in which something is heard, without the padding that the synthesiser puts round it. */
export function heardPart(samples: Int16Array): Int16Array {
  const heard = (sample: number) => Math.abs(sample) > silence
  const first = samples.findIndex(heard)
  if (first < 0) return samples.subarray(0, 0)
  return samples.subarray(first, samples.findLastIndex(heard) + 1)
}
