/** How far ffmpeg can be fenced in on this machine: own namespaces, else no rights, else only limits. */
export type Fence = 'bwrap' | 'setpriv' | 'plain'

/** What one run may touch. Times in seconds, sizes in bytes. */
export type Reach = { reads: string[]; writes: string | null; cpuS: number; fileBytes: number; nice: number }

/** Bound for address space; the four-size ladder from 1080p fails at 1.0 GB and passes at 1.5 GB (measured), 4K needs more. */
const addressSpace = 6_000_000_000

const systemFolders = ['/usr', '/lib', '/lib64', '/bin', '/etc/alternatives', '/etc/ld.so.cache']

function bubblewrap(reach: Reach): string[] {
  return [
    'bwrap',
    ...['--unshare-all', '--die-with-parent', '--cap-drop', 'ALL', '--uid', '65534', '--gid', '65534'],
    // libblas is found through /etc/alternatives on Debian; without it ffmpeg does not start.
    ...systemFolders.flatMap((folder) => ['--ro-bind-try', folder, folder]),
    ...['--proc', '/proc', '--dev', '/dev', '--tmpfs', '/tmp'],
    ...reach.reads.flatMap((path) => ['--ro-bind', path, path]),
    ...(reach.writes ? ['--bind', reach.writes, reach.writes] : []),
    ...['--chdir', '/tmp'],
  ]
}

/** Dies with the worker, can gain nothing, and root keeps no right beyond its own files. */
function fewerRights(): string[] {
  return ['setpriv', '--pdeathsig', 'KILL', '--no-new-privs', '--bounding-set=-all', '--inh-caps=-all']
}

/**
 * The words put before `ffmpeg` or `ffprobe`, to be started by /usr/bin/env. Every one of them replaces itself by the next
 * (exec), so the process id that the caller knows is the leader of a group holding the whole tree. The environment is
 * emptied: no secret of the worker is within reach of a demuxer.
 */
export function fencedPrefix(fence: Fence, reach: Reach): string[] {
  const inner = fence === 'bwrap' ? bubblewrap(reach) : fence === 'setpriv' ? fewerRights() : []
  return [
    ...['-i', 'PATH=/usr/local/bin:/usr/bin:/bin', 'LC_ALL=C'],
    'setsid',
    ...['nice', '-n', String(reach.nice)],
    // Last in line for the disk, but in line: the idle class starves for minutes beside a busy database (seen).
    ...['ionice', '-c', '2', '-n', '7'],
    'prlimit',
    ...[
      `--as=${addressSpace}`,
      `--cpu=${Math.ceil(reach.cpuS)}`,
      `--fsize=${Math.ceil(reach.fileBytes)}`,
      '--nofile=256',
    ],
    ...inner,
  ]
}

/** Tries the fences from the best down; `starts` says whether ffmpeg's version could be read behind these words. */
export async function bestFence(starts: (prefix: string[]) => Promise<boolean>): Promise<Fence> {
  const reach: Reach = { reads: [], writes: null, cpuS: 20, fileBytes: 1e6, nice: 0 }
  for (const fence of ['bwrap', 'setpriv'] as const) {
    if (await starts(fencedPrefix(fence, reach))) return fence
  }
  return 'plain'
}
