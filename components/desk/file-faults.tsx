import { Notice } from '@/components/ui/notice'
import type { ApiProblem } from '@/lib/http/client'

/** Why a file was not taken, line by line. */
export function FileFaults({ problem }: { problem: ApiProblem }) {
  return (
    <Notice tone={problem.status === 0 ? 'offline' : 'failed'} title={problem.detail}>
      {problem.errors.length > 0 && (
        <ul className="mt-2 grid gap-1">
          {problem.errors.slice(0, 20).map(({ path, message }, n) => (
            <li key={`${path} ${n}`}>
              <span className="font-mono">{path}</span>: {message}
            </li>
          ))}
          {problem.errors.length > 20 && <li>And {problem.errors.length - 20} more.</li>}
        </ul>
      )}
    </Notice>
  )
}
