'use client'

import { type DragEvent, useState } from 'react'
import { buttonClass } from '@/components/ui/button'
import { classNames } from '@/components/ui/class-names'
import { useHydrated } from '@/components/ui/use-hydrated'

type FootageDropProps = { title: string; hint: string; choose: string; onFile: (file: File) => void }

const accepted = 'video/*,.mp4,.mov,.m4v,.mkv,.webm,.avi,.mts,.m2ts,.ts,.3gp,.mpg'

/** A place to drop a film on, with a button that opens the files. */
export function FootageDrop({ title, hint, choose, onFile }: FootageDropProps) {
  const [isOver, setOver] = useState(false)
  const hydrated = useHydrated()
  const over = (event: DragEvent) => {
    event.preventDefault()
    setOver(true)
  }
  const drop = (event: DragEvent) => {
    event.preventDefault()
    setOver(false)
    const file = event.dataTransfer.files[0]
    if (file) onFile(file)
  }
  return (
    <div
      onDragOver={over}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={classNames(
        'grid justify-items-start gap-3 border-[1.5px] border-dashed px-6 py-8',
        isOver ? 'border-act bg-mist' : 'border-edge bg-sheet',
      )}
    >
      <h3 className="text-xl">{title}</h3>
      <p className="max-w-measure text-ink-2">{hint}</p>
      <label className={buttonClass('primary', 'cursor-pointer focus-within:outline-3 focus-within:outline-offset-2')}>
        {choose}
        <input
          type="file"
          accept={accepted}
          disabled={!hydrated}
          className="sr-only"
          onChange={(event) => {
            const file = event.currentTarget.files?.[0]
            if (file) onFile(file)
            // The same file may be chosen again after a refusal.
            event.currentTarget.value = ''
          }}
        />
      </label>
      <noscript>
        <p>Sending a film needs JavaScript, because a long upload must be able to stop and go on.</p>
      </noscript>
    </div>
  )
}
