import sharp from 'sharp'
import { describe, expect, it } from 'vitest'
import { redrawPhoto } from '@/media/photos'

/** Red above, blue below, as the sensor of a camera that was held sideways would write it. */
const sideways = async () => {
  const half = (background: string) =>
    sharp({ create: { width: 60, height: 20, channels: 3, background } })
      .png()
      .toBuffer()
  const [red, blue] = [await half('#ff0000'), await half('#0000ff')]
  return sharp({ create: { width: 60, height: 40, channels: 3, background: '#000000' } })
    .composite([
      { input: red, top: 0, left: 0 },
      { input: blue, top: 20, left: 0 },
    ])
    .jpeg({ quality: 100 })
    .withExif({ IFD0: { Make: 'Camera', ImageDescription: 'our yard' }, IFD3: { GPSLatitude: '43/1 28/1 2/1' } })
    .withMetadata({ orientation: 6 })
    .toBuffer()
}

const refusal = (bytes: Buffer) =>
  redrawPhoto(bytes).then(
    () => 'taken',
    (failure: { code: string }) => failure.code,
  )

describe('a photo from a phone', () => {
  it('is turned upright, and nothing stays of what the camera wrote beside the picture', async () => {
    const sent = await sideways()
    const before = await sharp(sent).metadata()
    expect([before.orientation, before.exif === undefined]).toEqual([6, false])

    const photo = await redrawPhoto(sent)
    const after = await sharp(photo.bytes).metadata()
    expect([after.format, after.width, after.height]).toEqual(['webp', 40, 60])
    expect([photo.width, photo.height]).toEqual([40, 60])
    expect([after.exif, after.xmp, after.iptc, after.orientation]).toEqual([undefined, undefined, undefined, undefined])
    expect(photo.bytes.includes('our yard')).toBe(false)
    // Orientation 6 is to be turned a quarter clockwise: what was above stands at the right (Exif 2.32, tag 0x0112).
    const { data } = await sharp(photo.bytes).removeAlpha().raw().toBuffer({ resolveWithObject: true })
    const pixel = (x: number, y: number) => [...data.subarray((y * 40 + x) * 3, (y * 40 + x) * 3 + 3)]
    expect(pixel(30, 30)[0]).toBeGreaterThan(200)
    expect(pixel(10, 30)[2]).toBeGreaterThan(200)
  })

  it('is made smaller to 2048 pixels on its longer side, and never larger', async () => {
    const large = await sharp({ create: { width: 4100, height: 1000, channels: 3, background: '#567' } })
      .png()
      .toBuffer()
    expect(await redrawPhoto(large)).toMatchObject({ width: 2048, height: 500 })
  })
})

describe('what is no photo', () => {
  it('is refused by its first bytes, whatever it is called', async () => {
    expect(await refusal(Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>'))).toBe('drawing')
    expect(await refusal(Buffer.from('<?xml version="1.0"?><svg width="9"/>'))).toBe('drawing')
    expect(await refusal(Buffer.from('\0\0\0\x18ftypheic\0\0\0\0', 'latin1'))).toBe('heic')
    expect(await refusal(Buffer.from('GIF89a'))).toBe('no-photo')
    expect(await refusal(Buffer.alloc(0))).toBe('no-photo')
    expect(await refusal(Buffer.from('hello'))).toBe('no-photo')
  })

  it('is refused when it is cut off or holds more pixels than a camera has', async () => {
    const whole = await sideways()
    expect(await refusal(whole.subarray(0, 200))).toBe('broken')
    const bomb = await sharp({ create: { width: 8000, height: 7000, channels: 3, background: '#000' } })
      .png({ compressionLevel: 9 })
      .toBuffer()
    expect(await refusal(bomb)).toBe('too-many-pixels')
  })
})
