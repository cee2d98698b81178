'use client'

import { useState } from 'react'
import { Field, controlClass } from '@/components/ui/field'
import { PHOTO_BYTES_MOST, PHOTOS_MOST } from '@/lib/questions/limits'

function problemOf(photos: File[]): string | null {
  if (photos.length > PHOTOS_MOST) return `At most ${PHOTOS_MOST} photos.`
  const large = photos.find(({ size }) => size > PHOTO_BYTES_MOST)
  return large ? `“${large.name}” is larger than ${PHOTO_BYTES_MOST / 1024 / 1024} MB.` : null
}

/** Photos from the camera or the phone's album. What is wrong with them is said before they are sent over a poor line. */
export function PhotoPicker() {
  const [error, setError] = useState<string | null>(null)
  return (
    <Field
      label="Photos"
      hint={`Up to ${PHOTOS_MOST}, as JPEG, PNG or WebP. Where and when they were taken is removed.`}
      error={error}
    >
      {(control) => (
        <input
          {...control}
          type="file"
          name="photos"
          multiple
          accept="image/jpeg,image/png,image/webp"
          className={controlClass}
          onChange={({ currentTarget }) => {
            const problem = problemOf([...(currentTarget.files ?? [])])
            setError(problem)
            currentTarget.setCustomValidity(problem ?? '')
          }}
        />
      )}
    </Field>
  )
}
