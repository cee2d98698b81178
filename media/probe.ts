import { z } from 'zod'
import { runFfprobe } from './ffmpeg'

const number = z.coerce.number().catch(Number.NaN)

const streamSchema = z.object({
  index: z.number(),
  codec_type: z.string().catch('unknown'),
  codec_name: z.string().catch('unknown'),
  width: number.optional(),
  height: number.optional(),
  pix_fmt: z.string().optional(),
  color_transfer: z.string().optional(),
  field_order: z.string().optional(),
  sample_aspect_ratio: z.string().optional(),
  r_frame_rate: z.string().optional(),
  avg_frame_rate: z.string().optional(),
  nb_frames: number.optional(),
  start_time: number.optional(),
  duration: number.optional(),
  channels: number.optional(),
  disposition: z.object({ attached_pic: z.number().catch(0) }).optional(),
  side_data_list: z.array(z.object({ rotation: z.number().optional() })).optional(),
})

const probeSchema = z.object({
  streams: z.array(streamSchema).catch([]),
  format: z
    .object({ format_name: z.string().catch(''), start_time: number.optional(), duration: number.optional() })
    .catch({ format_name: '' }),
})

export type ProbedStream = z.infer<typeof streamSchema>
export type Probe = z.infer<typeof probeSchema>

/** What the file says about itself. Only named fields are read; tags are asked for by nobody. @throws MediaFailure */
export async function probe(path: string): Promise<Probe> {
  const fields =
    'stream=index,codec_type,codec_name,width,height,pix_fmt,color_transfer,field_order,sample_aspect_ratio,' +
    'r_frame_rate,avg_frame_rate,nb_frames,start_time,duration,channels:stream_disposition=attached_pic:' +
    'stream_side_data=rotation:format=format_name,start_time,duration'
  return probeSchema.parse(JSON.parse(await runFfprobe(path, ['-of', 'json', '-show_entries', fields])))
}

/** Where the packets of one stream end, and how many were read. Seconds. */
export type PacketTruth = { first: number; end: number; count: number }

/** Reads packets (never decodes). `fromS` seeks close to the end, which is enough to know that the end is there. */
export async function readPackets(
  path: string,
  stream: number,
  fromS: number | null,
  timeoutMs: number,
): Promise<PacketTruth> {
  const interval = fromS === null ? [] : ['-read_intervals', `${Math.max(0, fromS).toFixed(3)}%`]
  const wanted = ['-select_streams', String(stream), '-show_entries', 'packet=pts_time,dts_time,duration_time']
  const text = await runFfprobe(path, [...interval, ...wanted, '-of', 'csv=p=0'], timeoutMs)
  const truth: PacketTruth = { first: Number.POSITIVE_INFINITY, end: 0, count: 0 }
  for (const line of text.split('\n')) {
    const [pts, dts, length] = line.split(',').map(Number.parseFloat)
    const at = pts !== undefined && Number.isFinite(pts) ? pts : dts
    if (at === undefined || !Number.isFinite(at)) continue
    truth.count += 1
    truth.first = Math.min(truth.first, at)
    truth.end = Math.max(truth.end, at + (length !== undefined && Number.isFinite(length) ? length : 0))
  }
  return truth
}
