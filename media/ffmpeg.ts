/**
 * The one place that starts ffmpeg and ffprobe. Encoding goes through fluent-ffmpeg (archived; pinned and kept behind this
 * file so that it can be replaced), probing is our own call, because fluent's reader of ffprobe's flat text can be fed a
 * whole stream by a tag with line breaks (measured).
 */
import { execFile, spawn, type ChildProcess } from 'node:child_process'
import ffmpegCommand from 'fluent-ffmpeg'
import { cancelled, failureOf, MediaFailure } from './failure'
import { bestFence, fencedPrefix, type Fence, type Reach } from './guard'
import { inputGuard, limits } from './limits'

const starter = '/usr/bin/env'

export type FfmpegRun = {
  inputs: { path: string; options?: string[] }[]
  /** Filter graph with labelled ends. Never built from anybody's text. */
  graph?: string
  outputs: { path: string; options: string[] }[]
  /** The only folder that the run can write to. */
  writes: string
  /** Length of what will be made, seconds: for progress and for the limits on time and room. */
  durationS: number
  onProgress?: (fraction: number) => void
  signal?: AbortSignal
  stallMs?: number
}

let fence: Promise<Fence> | null = null

/** Which fence holds here; tried once per process. */
export function currentFence(): Promise<Fence> {
  fence ??= bestFence(
    (prefix) =>
      new Promise((resolve) => {
        execFile(starter, [...prefix, 'ffmpeg', '-version'], { timeout: 20_000 }, (error) => resolve(error === null))
      }),
  )
  return fence
}

let prepared: Promise<void> | null = null

/**
 * fluent-ffmpeg keeps one path to ffmpeg per process and asks it for formats and encoders before the first run. It gets the
 * real one for these questions; afterwards the path is env, and the fence stands in front as the first words of each run.
 */
function prepareFluent(): Promise<void> {
  prepared ??= new Promise((resolve, reject) => {
    const command = ffmpegCommand()
    command.setFfmpegPath('ffmpeg')
    command.getAvailableFormats((noFormats) => {
      command.getAvailableEncoders((noEncoders) => {
        command.setFfmpegPath(starter)
        const error: unknown = noFormats ?? noEncoders
        if (error)
          reject(
            new MediaFailure('interrupted', 'no-ffmpeg', 'The film cannot be worked on at the moment.', String(error)),
          )
        else resolve()
      })
    })
  })
  prepared.catch(() => (prepared = null))
  return prepared
}

function reachOf(run: FfmpegRun): Reach {
  return {
    reads: run.inputs.map((input) => input.path),
    writes: run.writes,
    cpuS: 900 + run.durationS * 60,
    fileBytes: 500e6 + run.durationS * 1.5e6,
    nice: 10,
  }
}

function build(run: FfmpegRun, prefix: string[]): ffmpegCommand.FfmpegCommand {
  const command = ffmpegCommand({ stdoutLines: 20 })
  run.inputs.forEach(({ path, options = [] }, index) => {
    const start =
      index === 0 ? [...prefix, 'ffmpeg', '-nostdin', '-hide_banner', '-v', 'error', ...progressOptions] : []
    // Separate arguments on purpose: given an array, fluent splits each word at its spaces.
    command.input(`file:${path}`).inputOptions(...start, ...inputGuard(), ...options)
  })
  if (run.graph) command.complexFilter(run.graph)
  for (const { path, options } of run.outputs) command.output(`file:${path}`).outputOptions(...options, ...keepNothing)
  return command
}

const progressOptions = ['-nostats', '-stats_period', '0.5', '-progress', 'pipe:2']
/** Place, device and every other tag of the camera stay out of what is served; so do data and subtitle streams. */
const keepNothing = ['-dn', '-sn', '-map_metadata', '-1', '-map_chapters', '-1']

/** SIGKILL to the whole group: a looping ffmpeg ignores SIGTERM, and SIGTERM leaves a valid but short file behind. */
function killGroup(child: ChildProcess | undefined): void {
  if (!child?.pid) return
  try {
    process.kill(-child.pid, 'SIGKILL')
  } catch {
    // Before setsid has run there is no group yet.
    child.kill('SIGKILL')
  }
}

/** Runs ffmpeg to its end. Resolves only after exit 0; on any failure the process is gone before the promise rejects. */
export async function runFfmpeg(run: FfmpegRun): Promise<void> {
  if (run.signal?.aborted) throw cancelled()
  await prepareFluent()
  const command = build(run, fencedPrefix(await currentFence(), reachOf(run)))
  await new Promise<void>((resolve, reject) => watch(command, run, resolve, reject))
}

function watch(
  command: ffmpegCommand.FfmpegCommand,
  run: FfmpegRun,
  resolve: () => void,
  reject: (error: Error) => void,
) {
  let ended: MediaFailure | null = null
  const lastWords: string[] = []
  const stop = (why: MediaFailure) => {
    ended ??= why
    killGroup((command as { ffmpegProc?: ChildProcess }).ffmpegProc)
  }
  const onAbort = () => stop(cancelled())
  let stall = setTimeout(hangs, run.stallMs ?? limits.stallMs)
  function hangs() {
    stop(new MediaFailure('interrupted', 'stalled', 'Work on this film came to a halt. It will be tried again.'))
  }
  const done = (finish: () => void) => {
    clearTimeout(stall)
    run.signal?.removeEventListener('abort', onAbort)
    finish()
  }
  run.signal?.addEventListener('abort', onAbort, { once: true })
  // What was asked to stop before there was a process has to be told again.
  command.on('start', () => ended && stop(ended))
  command.on('stderr', (line: string) => {
    const seconds = /^out_time_us=(\d+)/.exec(line)
    if (!seconds) return void (isProgress(line) || (lastWords.push(line), lastWords.splice(0, lastWords.length - 20)))
    clearTimeout(stall)
    stall = setTimeout(hangs, run.stallMs ?? limits.stallMs)
    if (!ended && run.durationS > 0) run.onProgress?.(Math.min(1, Number(seconds[1]) / 1e6 / run.durationS))
  })
  command.on('end', () => done(() => (ended ? reject(ended) : resolve())))
  command.on('error', (error: Error) => done(() => reject(ended ?? failureOf(error.message, lastWords.join('\n')))))
  command.run()
}

const isProgress = (line: string) => /^[a-z0-9_]+=\S*$|^\s*$|^(frame|fps|bitrate|total_size|speed)=/.test(line)

/** Runs ffprobe on one file and returns its standard output. @throws MediaFailure `invalid` when it cannot be read */
export async function runFfprobe(path: string, options: string[], timeoutMs: number = limits.probeMs): Promise<string> {
  const reach: Reach = { reads: [path], writes: null, cpuS: timeoutMs / 1000 + 5, fileBytes: 1e6, nice: 0 }
  const prefix = fencedPrefix(await currentFence(), reach)
  const words = [...prefix, 'ffprobe', '-hide_banner', '-v', 'error', ...inputGuard(), ...options, `file:${path}`]
  return new Promise((resolve, reject) => {
    const child = spawn(starter, words, { stdio: ['ignore', 'pipe', 'pipe'] })
    const timer = setTimeout(() => killGroup(child), timeoutMs)
    let out = ''
    let errors = ''
    child.stdout.setEncoding('utf8').on('data', (text: string) => {
      out += text
      if (out.length > limits.probeBytes) killGroup(child)
    })
    child.stderr.setEncoding('utf8').on('data', (text: string) => (errors = (errors + text).slice(-4000)))
    child.on('error', (error) => reject(failureOf(error.message, '')))
    child.on('close', (code, signal) => {
      clearTimeout(timer)
      if (code === 0) resolve(out)
      else reject(new MediaFailure('invalid', 'unreadable', '', `ffprobe ${signal ?? code}: ${errors.trim()}`))
    })
  })
}
